import { fundusArea, fundusLine, fundusPoint, radiusAt, rim } from './fundus-model.ts';
import type { GlobeModel } from './globe-model.ts';

const hours = Array.from({ length: 12 }, (_, index) => index + 1);

/** Disc beside the macula: nasal is right in a right eye, as the surgeon sees it. */
const discX = (eye: 'right' | 'left') => (eye === 'right' ? 14 : -14);

/** The inside of the eye as it is drawn by hand: pole in the middle, ora near the rim, detached retina shaded, breaks numbered. */
export const FundusView = ({ model }: { model: GlobeModel }) => {
  const { poleMm, detached } = model;
  return (
    <g transform="translate(90 82) scale(0.96)">
      <circle className="fundus-rim" r={rim} />
      {detached !== null && (
        <path className="globe-detached" d={fundusArea(detached.front, detached.back, poleMm)} />
      )}
      <path className="globe-ora" d={fundusLine(model.ora.from, poleMm)} />
      <circle className="globe-equator" r={radiusAt(model.equatorMm, poleMm)} />
      {model.elements.map((element) => (
        <path
          key={element.path}
          className="globe-element"
          d={fundusArea(element.front, element.back, poleMm)}
        />
      ))}
      <circle className="fundus-disc" cx={discX(model.eye)} r={4} />
      <path className="fundus-macula" d="M-2 0h4M0 -2v4" />
      {model.breaks.map((found) => {
        const mm = (found.frontMm + found.backMm) / 2;
        const [x, y] = fundusPoint({ clock: found.clock, mm }, poleMm);
        const [tx, ty] = fundusPoint({ clock: found.clock, mm: mm + 6 }, poleMm);
        return (
          <g
            key={found.path}
            data-unheld={found.shortfall !== null || undefined}
            data-unsure={!found.sure || undefined}
          >
            <circle className="globe-break" cx={x} cy={y} r={3.5} />
            <text className="globe-number" x={tx} y={ty + 3} textAnchor="middle">
              {found.number}
            </text>
          </g>
        );
      })}
      {hours.map((hour) => {
        const angle = (hour / 12) * 2 * Math.PI;
        return (
          <text
            key={hour}
            className="globe-label"
            x={(rim + 8) * Math.sin(angle)}
            y={-(rim + 8) * Math.cos(angle) + 3}
            textAnchor="middle"
          >
            {hour}
          </text>
        );
      })}
    </g>
  );
};
