import { arcHours, type ClockArc, quadrantMiddle, wrapClock } from '../../domain/anatomy/clock.ts';
import { equatorMm, type Globe, globeOf, poleMm } from '../../domain/anatomy/globe.ts';
import {
  INSERTION_BREADTH_MM,
  insertionMm,
  insertionsMm,
  oraRangeMm,
  type Rectus,
  rectusClock,
} from '../../domain/anatomy/insertions.ts';
import { hourMm } from '../../domain/anatomy/surface.ts';
import {
  type LyingBreak,
  type LyingElement,
  layBreak,
  layElement,
  supportByAll,
} from '../../domain/physics/support.ts';
import { specsOnPath } from '../../domain/record/field-tree.ts';
import type { BuckleElement, CaseRecord, Eye, RetinalBreak } from '../../domain/record/schema.ts';
import { recti } from '../../domain/record/stages/buckle.ts';
import { showClock } from '../ui/entry.ts';
import {
  deepest,
  type GlobeBreak,
  type GlobeElement,
  type GlobeModel,
  type GlobePoint,
} from './globe-model.ts';

const wholeRound: ClockArc = { from: 6, to: 6 };

/** Clock hours along an arc: its ends and each quarter between. */
const along = (arc: ClockArc): number[] => {
  const length = arcHours(arc);
  const first = Math.ceil(arc.from * 4 + 1e-6) / 4;
  const between: number[] = [];
  for (let hour = first; hour < arc.from + length - 1e-6; hour += 0.25) between.push(wrapClock(hour));
  return [arc.from, ...between, arc.to];
};

const curve = (arc: ClockArc, mmAt: (clock: number) => number): GlobePoint[] =>
  along(arc).map((clock) => ({ clock, mm: mmAt(clock) }));

const listed = <T>(items: readonly T[] | string | undefined): readonly T[] =>
  typeof items === 'string' || items === undefined ? [] : items;

const elementOf = (lying: LyingElement, element: BuckleElement, index: number, eye: Eye): GlobeElement => {
  const middle = wrapClock(lying.arc.from + arcHours(lying.arc) / 2);
  const edges = (clock: number) => lying.at(clock) ?? lying.at(middle) ?? [0, 0];
  const fixations = listed(element.fixation).flatMap(({ quadrant }) => {
    if (quadrant === undefined) return [];
    const clock = quadrantMiddle(quadrant, eye);
    const here = lying.at(clock);
    return here === null ? [] : [{ clock, mm: (here[0] + here[1]) / 2 }];
  });
  return {
    path: `buckle.elements.${index}`,
    front: curve(lying.arc, (clock) => edges(clock)[0]),
    back: curve(lying.arc, (clock) => edges(clock)[1]),
    fixations,
  };
};

const kindSpec = specsOnPath('breaks.found.kind').at(-1);
const kindTitle = (kind: RetinalBreak['kind']): string =>
  (kindSpec?.kind === 'choice' && kind !== undefined ? kindSpec.options[kind] : undefined) ??
  'kind not recorded';

/** How far a break lies from being on the elements, in words; `null` when it is held or nothing can be told. */
const shortfallOf = (
  found: RetinalBreak,
  lying: LyingBreak,
  elements: readonly (LyingElement | undefined)[],
): string | null => {
  const known = elements.filter((element) => element !== undefined);
  const canTell = known.length > 0 && known.length === elements.length && !lying.fromZone;
  if (!canTell || found.supportedByElements === 'none') return null;
  const { shortfallMm, bare } = supportByAll(lying, known);
  if (bare === 1) return 'no element here';
  return shortfallMm < 0.05 ? null : `${shortfallMm.toFixed(1)} mm not on the element`;
};

const breakOf = (
  found: RetinalBreak,
  index: number,
  globe: Globe,
  eye: Eye,
  elements: readonly (LyingElement | undefined)[],
): GlobeBreak[] => {
  if (found.clock === undefined) return [];
  const lying = layBreak(found, globe, eye);
  const place =
    lying === undefined
      ? 'depth not recorded'
      : `${lying.frontMm.toFixed(1)} to ${lying.backMm.toFixed(1)} mm behind the limbus`;
  return [
    {
      path: `breaks.found.${index}`,
      number: index + 1,
      title: `Break ${index + 1}, ${kindTitle(found.kind)} at ${showClock(found.clock)} o’clock, ${place}`,
      kind: found.kind ?? '',
      clock: found.clock,
      halfClockHours: (found.extentClockHours ?? 0) / 2,
      // Without a depth the mark stands at the limbus, where no break lies.
      frontMm: lying?.frontMm ?? 0,
      backMm: Math.min(deepest, lying?.backMm ?? 0),
      sure: lying !== undefined && !lying.fromZone,
      shortfall: lying === undefined ? null : shortfallOf(found, lying, elements),
    },
  ];
};

const detachedArc = ({ before }: CaseRecord): ClockArc | null => {
  if (before?.totalDetachment === true) return wholeRound;
  const { detachmentFromClock: from, detachmentToClock: to } = before ?? {};
  return from === undefined || to === undefined ? null : { from, to };
};

const counted = (count: number, one: string) => `${count} ${one}${count === 1 ? '' : 's'}`;

const summaryOf = (eye: Eye, breaks: readonly GlobeBreak[], elements: number, detached: ClockArc | null) =>
  [
    `Wall of the ${eye} eye laid flat, clock hours from 6 to 6 across, millimetres behind the limbus down`,
    detached === null
      ? ''
      : detached.from === detached.to
        ? 'detached all round'
        : `detached from ${showClock(detached.from)} to ${showClock(detached.to)} o’clock`,
    counted(elements, 'element'),
    ...breaks.map(({ title, shortfall }) => (shortfall === null ? title : `${title}: ${shortfall}`)),
  ]
    .filter((part) => part !== '')
    .join('; ');

/** The picture of one record; `null` until the eye is recorded, because its muscles stand mirrored in the other. */
export const globeFrom = (record: CaseRecord): GlobeModel | null => {
  const eye = record.who?.eye;
  if (eye === undefined) return null;
  const globe = globeOf(record.before?.axialLengthMm);
  const elements = listed(record.buckle?.elements);
  const laid = elements.map((element) => layElement(element, globe, eye));
  const drawn = elements.flatMap((element, index) => {
    const lying = laid[index];
    return lying === undefined ? [] : [elementOf(lying, element, index, eye)];
  });
  const breaks = listed(record.breaks?.found).flatMap((found, index) =>
    breakOf(found, index, globe, eye, laid),
  );
  const detached = detachedArc(record);
  return {
    insertions: curve(wholeRound, (clock) => insertionMm(clock, eye)),
    ora: {
      from: curve(wholeRound, (clock) => oraRangeMm(clock, eye)[0]),
      to: curve(wholeRound, (clock) => oraRangeMm(clock, eye)[1]),
    },
    equatorMm: equatorMm(globe),
    poleMm: poleMm(globe),
    eye,
    muscles: (Object.keys(insertionsMm) as Rectus[]).map((rectus) => ({
      name: recti[rectus],
      clock: rectusClock(rectus, eye),
      halfClockHours: INSERTION_BREADTH_MM / 2 / hourMm(globe, insertionsMm[rectus]),
      insertionMm: insertionsMm[rectus],
    })),
    detached:
      detached === null
        ? null
        : {
            front: curve(detached, (clock) => oraRangeMm(clock, eye)[1]),
            back: curve(detached, () => deepest - 2),
          },
    elements: drawn,
    breaks,
    summary: summaryOf(eye, breaks, drawn.length, detached),
  };
};
