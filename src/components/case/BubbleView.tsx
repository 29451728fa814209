import { globeOf } from '../../domain/anatomy/globe.ts';
import { labelOf } from '../../domain/drafting/words.ts';
import { arcOfFill, coverDegrees, type Position } from '../../domain/physics/bubble.ts';
import type { GlobeModel } from './globe-model.ts';

const radius = 44;

interface Tamponade {
  /** From 0 to 1. */
  fill: number;
  sinks: boolean;
}

/** A point of the wall so many degrees from the highest point, to the right or the left of it. */
const onWall = (degrees: number, side: 1 | -1): [number, number] => {
  const angle = (degrees * Math.PI) / 180;
  return [side * radius * Math.sin(angle), -radius * Math.cos(angle)];
};

/**
 * The cavity cut upright with the head in a position: the bubble at the highest point (heavy oil at the lowest), each break at its
 * angle from there. An estimate: a sphere, and a flat surface.
 */
export const BubbleView = ({
  model,
  position,
  tamponade,
  axialLengthMm,
}: {
  model: GlobeModel;
  position: Position;
  tamponade: Tamponade;
  axialLengthMm: number | undefined;
}) => {
  const half = arcOfFill(tamponade.fill) / 2;
  const level = radius * Math.cos((half * Math.PI) / 180) * (tamponade.sinks ? 1 : -1);
  const width = Math.sqrt(Math.max(0, radius ** 2 - level ** 2));
  const large = half > 90 ? 1 : 0;
  const cap = tamponade.sinks
    ? `M${width} ${level}A${radius} ${radius} 0 ${large} 1 ${-width} ${level}Z`
    : `M${-width} ${level}A${radius} ${radius} 0 ${large} 1 ${width} ${level}Z`;
  const globe = globeOf(axialLengthMm);
  const name = labelOf('aftercare.posture.position', position);
  return (
    <g>
      <circle className="fundus-rim" r={radius} />
      {tamponade.fill < 1 ? <path className="bubble" d={cap} /> : <circle className="bubble" r={radius} />}
      {model.breaks
        .filter(({ sure, backMm }) => sure || backMm > 0)
        .map((found, at) => {
          const place = { clock: found.clock, mm: (found.frontMm + found.backMm) / 2 };
          const cover =
            coverDegrees(globe, place, tamponade.fill, position, tamponade.sinks ? 'sinks' : 'floats') ?? 0;
          const fromPole = half - cover;
          const [x, y] = onWall(tamponade.sinks ? 180 - fromPole : fromPole, at % 2 === 0 ? 1 : -1);
          return (
            <g key={found.path} data-unheld={cover < 0 || undefined}>
              <circle className="globe-break" cx={x} cy={y} r={3.5} />
              <text className="globe-number" x={x * 0.76} y={y * 0.76 + 3} textAnchor="middle">
                {found.number}
              </text>
            </g>
          );
        })}
      <text className="globe-label" y={radius + 12} textAnchor="middle">
        {name}
      </text>
    </g>
  );
};
