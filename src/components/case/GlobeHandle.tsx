import { type KeyboardEvent, memo, type PointerEvent, useRef } from 'react';
import {
  breakSize,
  type GlobeBreak,
  type GlobePoint,
  globeHeight,
  globeLeft,
  globeSpan,
  globeTop,
  snapped,
  xOf,
  yOf,
} from './globe-model.ts';

interface Props {
  found: GlobeBreak;
  readOnly: boolean;
  onMove: (found: GlobeBreak, clockHours: number, mm: number) => void;
  onOpen: (found: GlobeBreak) => void;
}

/** Half hours and half millimetres to move by. */
const steps: Readonly<Record<string, readonly [number, number]>> = {
  ArrowLeft: [-0.5, 0],
  ArrowRight: [0.5, 0],
  ArrowUp: [0, -0.5],
  ArrowDown: [0, 0.5],
};

/** Room around a break that takes hold of it, in units of the picture. */
const reach = 8;

const percent = (part: number, whole: number) => `${((100 * part) / whole).toFixed(2)}%`;

const pointAt = (event: PointerEvent<HTMLButtonElement>): GlobePoint | null => {
  const picture = event.currentTarget.parentElement?.querySelector('svg')?.getBoundingClientRect();
  if (picture === undefined) return null;
  const scale = globeSpan / picture.width;
  return snapped(
    (event.clientX - picture.left) * scale + globeLeft,
    (event.clientY - picture.top) * scale + globeTop,
  );
};

/** The shortest way round the clock from one hour to another. */
const turn = (from: number, to: number): number => ((((to - from + 6) % 12) + 12) % 12) - 6;

/** Takes hold of a break in the picture: by pointer, or with the arrows; Enter opens its fields. */
export const GlobeHandle = memo(({ found, readOnly, onMove, onOpen }: Props) => {
  const held = useRef<GlobePoint | null>(null);
  const { rx, ry } = breakSize(found);
  const [x, y] = [xOf(found.clock) - globeLeft, yOf((found.frontMm + found.backMm) / 2) - globeTop];

  const onKeyDown = (event: KeyboardEvent) => {
    if (event.altKey || event.ctrlKey || event.metaKey) return;
    const step = steps[event.key];
    if (step !== undefined && !readOnly) onMove(found, step[0], step[1]);
    else if (event.key === 'Enter') onOpen(found);
    else return;
    event.preventDefault();
    event.stopPropagation();
  };
  const onPointerDown = (event: PointerEvent<HTMLButtonElement>) => {
    if (readOnly) return;
    event.currentTarget.setPointerCapture(event.pointerId);
    held.current = pointAt(event);
  };
  const onPointerMove = (event: PointerEvent<HTMLButtonElement>) => {
    const from = held.current;
    const to = from === null ? null : pointAt(event);
    if (from === null || to === null || (to.clock === from.clock && to.mm === from.mm)) return;
    held.current = to;
    onMove(found, turn(from.clock, to.clock), to.mm - from.mm);
  };
  const letGo = () => {
    held.current = null;
  };

  return (
    <button
      type="button"
      className="globe-handle"
      style={{
        left: percent(x - rx - reach, globeSpan),
        top: percent(y - ry - reach, globeHeight),
        width: percent(2 * (rx + reach), globeSpan),
        height: percent(2 * (ry + reach), globeHeight),
      }}
      aria-label={`${found.title}. ${found.shortfall ?? ''} Arrows move it, Enter opens its fields.`}
      onKeyDown={onKeyDown}
      onDoubleClick={() => onOpen(found)}
      onPointerDown={onPointerDown}
      onPointerMove={onPointerMove}
      onPointerUp={letGo}
      onPointerCancel={letGo}
    />
  );
});
