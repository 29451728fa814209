import { type RefObject, useLayoutEffect, useMemo, useRef } from 'react';
import { isAnswered } from '../../domain/checks/flag.ts';
import type { Statement } from '../../domain/drafting/sheet.ts';
import { flagId } from './desk-store.ts';
import { explain } from './explain.ts';
import { FlagNote } from './FlagNote.tsx';
import { type PlacedFlag, placeFlags, worstFirst } from './flag-order.ts';
import { stackNotes } from './margin-layout.ts';
import { PartedNote } from './PartedNote.tsx';
import { standing } from './sheet-doc.ts';
import { useDesk } from './use-desk.ts';

const gap = 10;
/** Height of the first line of a note, where its thread ends. */
const firstLine = 12;

interface Anchor {
  id: string;
  beside: string | null;
  tied: boolean;
}

const statementElement = (desk: HTMLElement, id: string) =>
  desk.querySelector(`.sheet [data-statement="${CSS.escape(id)}"]`);

/** Puts the notes level with their words and draws the threads between them. */
const arrange = (desk: HTMLElement, margin: HTMLElement, anchors: readonly Anchor[]) => {
  const svg = margin.querySelector('svg');
  const paper = desk.querySelector('.sheet');
  if (svg === null || paper === null) return;
  const origin = margin.getBoundingClientRect();
  const paperRight = paper.getBoundingClientRect().right;
  const notes = anchors.flatMap((anchor) => {
    const element = document.getElementById(anchor.id);
    if (element === null) return [];
    const words = anchor.beside === null ? null : statementElement(desk, anchor.beside);
    const line = words?.getClientRects()[0];
    const level = line === undefined ? null : (line.top + line.bottom) / 2 - origin.top;
    return [{ ...anchor, element, level, height: element.offsetHeight }];
  });
  const placed = notes.filter((note) => note.level !== null).sort((a, b) => (a.level ?? 0) - (b.level ?? 0));
  const loose = notes.filter((note) => note.level === null);
  const all = [...placed, ...loose];
  const tops = stackNotes(
    all.map((note) => ({ wanted: Math.max(0, (note.level ?? 0) - firstLine), height: note.height })),
    gap,
  );
  let paths = '';
  all.forEach((note, index) => {
    const top = tops[index] ?? 0;
    note.element.style.top = `${top}px`;
    if (note.level === null || !note.tied) return;
    const left = paperRight - origin.left - 44;
    const level = note.element.className.match(/note-(contradiction|omission|caution|parted)/)?.[1] ?? '';
    paths += `<path class="thread thread-${level}" d="M${left} ${note.level}H-10L4 ${top + firstLine}H12"/>`;
  });
  svg.innerHTML = paths;
  const last = all.at(-1);
  margin.style.minHeight = `${last === undefined ? 0 : (tops.at(-1) ?? 0) + last.height + gap}px`;
};

const anchorsOf = (placed: readonly PlacedFlag[], parted: readonly Statement[]): Anchor[] => [
  ...parted.map(({ id }) => ({ id: `parted:${id}`, beside: id, tied: true })),
  ...placed.map(({ flag, beside, underlaid }) => ({ id: flagId(flag), beside, tied: underlaid })),
];

/** The margin: flags beside the words that they are about, and what has parted from its facts. */
export const Margin = ({ desk }: { desk: RefObject<HTMLElement | null> }) => {
  const margin = useRef<HTMLElement>(null);
  const flags = useDesk((state) => state.flags);
  const sheet = useDesk((state) => state.sheet);
  const answers = useDesk((state) => state.answers);
  const placed = useMemo(() => placeFlags(worstFirst(flags), sheet), [flags, sheet]);
  const parted = useMemo(
    () => sheet.sections.flatMap(standing).filter((statement) => statement.origin === 'parted'),
    [sheet],
  );
  // After every drawing of the notes, and whenever the words or the size of paper or notes change.
  useLayoutEffect(() => {
    const draw = () => {
      if (desk.current !== null && margin.current !== null) {
        arrange(desk.current, margin.current, anchorsOf(placed, parted));
      }
    };
    draw();
    const sizes = new ResizeObserver(draw);
    const words = new MutationObserver(draw);
    const paper = desk.current?.querySelector('.sheet');
    if (paper !== null && paper !== undefined) {
      sizes.observe(paper);
      words.observe(paper, { childList: true, characterData: true, subtree: true });
    }
    for (const note of margin.current?.querySelectorAll('.note') ?? []) sizes.observe(note);
    document.fonts.ready.then(draw);
    return () => {
      sizes.disconnect();
      words.disconnect();
    };
  });

  const open = placed.filter(({ flag }) => !isAnswered(flag, answers));
  return (
    <aside ref={margin} className="margin" aria-label="Margin: flags">
      <svg className="threads" aria-hidden="true" />
      {open.length === 0 && parted.length === 0 && placed.length === 0 && (
        <p className="margin-clean">No flags.</p>
      )}
      <ul>
        {parted.map((statement) => (
          <PartedNote key={statement.id} statement={statement} />
        ))}
        {placed.map(({ flag }) => (
          <FlagNote key={flagId(flag)} flag={flag} explain={explain} />
        ))}
      </ul>
    </aside>
  );
};
