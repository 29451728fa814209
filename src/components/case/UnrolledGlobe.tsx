import { useCallback, useState } from 'react';
import { valueAt } from '../../domain/record/paths.ts';
import { showClock } from '../ui/entry.ts';
import { GlobeHandle } from './GlobeHandle.tsx';
import {
  areaBetween,
  type GlobeBreak as Break,
  breakSize,
  deepest,
  type GlobeElement,
  type GlobeModel,
  globeHeight,
  globeLeft,
  globeSpan,
  globeTop,
  globeWidth,
  lineThrough,
  xOf,
  yOf,
} from './globe-model.ts';
import { goToField } from './go-to-field.ts';
import { useDeskTools } from './use-desk.ts';
import { useGlobeModel } from './use-globe-model.ts';

const hours = Array.from({ length: 13 }, (_, index) => ({
  hour: ((index + 5) % 12) + 1,
  x: (index * globeWidth) / 12,
}));

const Scales = () => (
  <g className="globe-scale">
    <path d={`M0 0H${globeWidth}`} />
    {hours.map(({ hour, x }) => (
      <text key={x} x={x} y={-5} textAnchor="middle">
        {hour}
      </text>
    ))}
    {[0, 5, 10, 15, 20].map((mm) => (
      <text key={mm} x={-5} y={yOf(mm) + 3} textAnchor="end">
        {mm}
      </text>
    ))}
  </g>
);

/** Left and breadth of a muscle, in two pieces where it lies across 6. */
const strips = (from: number, to: number) => {
  const [start, end] = [xOf(from), xOf(to)];
  if (end >= start) return [{ x: start, width: end - start }];
  return [
    { x: start, width: globeWidth - start },
    { x: 0, width: end },
  ];
};

const Anatomy = ({ model }: { model: GlobeModel }) => (
  <g>
    {model.muscles.flatMap((muscle) =>
      strips(muscle.clock - muscle.halfClockHours, muscle.clock + muscle.halfClockHours).map(
        ({ x, width }) => (
          <rect
            key={`${muscle.name} ${x}`}
            className="globe-muscle"
            x={x}
            y={yOf(muscle.insertionMm)}
            width={width}
            height={yOf(deepest - 2) - yOf(muscle.insertionMm)}
          />
        ),
      ),
    )}
    {model.muscles.map((muscle) => (
      <text
        key={muscle.name}
        className="globe-label"
        x={Math.min(globeWidth - 2, Math.max(2, xOf(muscle.clock)))}
        y={yOf(deepest - 2) + 11}
        textAnchor={muscle.clock === 6 ? 'start' : 'middle'}
      >
        {muscle.name}
      </text>
    ))}
    <path className="globe-equator" d={`M0 ${yOf(model.equatorMm)}H${globeWidth}`} />
    <text className="globe-label" x={globeWidth} y={yOf(model.equatorMm) - 3} textAnchor="end">
      equator
    </text>
    <path className="globe-ora" d={lineThrough(model.ora.from)} />
    <path className="globe-ora" d={lineThrough(model.ora.to)} />
    <path className="globe-insertions" d={lineThrough(model.insertions)} />
  </g>
);

const ElementShape = ({ element }: { element: GlobeElement }) => (
  <g>
    <path className="globe-element" d={areaBetween(element)} />
    {element.fixations.map(({ clock, mm }) => (
      <path
        key={clock}
        className="globe-fixation"
        d={`M${xOf(clock) - 3} ${yOf(mm) - 14}l6 28m0 -28l-6 28`}
      />
    ))}
  </g>
);

const anchorOf = (x: number) => (x > globeWidth * 0.7 ? 'end' : x < globeWidth * 0.3 ? 'start' : 'middle');

/** One break at its size: a tear as a flap, a hole as a ring; one that is not held stands out, and says by how much. */
const BreakShape = ({ found }: { found: Break }) => {
  const { rx, ry } = breakSize(found);
  const x = xOf(found.clock);
  const y = yOf((found.frontMm + found.backMm) / 2);
  return (
    <g data-unheld={found.shortfall !== null || undefined} data-unsure={!found.sure || undefined}>
      {found.shortfall !== null && <circle className="globe-unheld" cx={x} cy={y} r={Math.max(rx, ry) + 4} />}
      {found.kind === 'horseshoe' ? (
        <path
          className="globe-break"
          d={`M${x - rx} ${y + ry}Q${x - rx} ${y - ry} ${x} ${y - ry}T${x + rx} ${y + ry}`}
        />
      ) : (
        <ellipse className="globe-break" cx={x} cy={y} rx={rx} ry={ry} />
      )}
      <text className="globe-number" x={x + rx + 3} y={y - ry}>
        {found.number}
      </text>
      {found.shortfall !== null && (
        <text
          className="globe-shortfall"
          x={Math.min(globeWidth - 2, Math.max(2, x))}
          y={y + ry + 16}
          textAnchor={anchorOf(x)}
        >
          {found.shortfall}
        </text>
      )}
    </g>
  );
};

const placeInWords = (found: Break, clock: number, frontMm: number) =>
  `Break ${found.number} at ${showClock(clock)} o’clock, ${frontMm} mm behind the limbus`;

/** The eye wall laid flat: clock hours across from 6 to 6, millimetres behind the limbus down. */
export const UnrolledGlobe = () => {
  const { store, readOnly } = useDeskTools();
  const [said, setSaid] = useState('');
  const model = useGlobeModel();

  const move = useCallback(
    (found: Break, clockHours: number, mm: number) => {
      const hour = found.clock + clockHours;
      const clock = hour < 1 ? hour + 12 : hour >= 13 ? hour - 12 : hour;
      const edges = ['frontEdgeMm', 'backEdgeMm'].flatMap((edge) => {
        const path = `${found.path}.${edge}`;
        const now = valueAt(store.get().record, path);
        return mm !== 0 && typeof now === 'number'
          ? [[path, Math.min(deepest, Math.max(0, now + mm))] as const]
          : [];
      });
      const turned = clockHours === 0 ? [] : [[`${found.path}.clock`, clock] as const];
      store.recordAll([...turned, ...edges], `move ${found.path}`);
      setSaid(placeInWords(found, clock, Math.max(0, found.frontMm + mm)));
    },
    [store],
  );
  const openBreak = useCallback((found: Break) => goToField(store, `${found.path}.clock`), [store]);

  if (model === null) {
    return <p className="globe globe-absent">The globe is drawn here once the eye is recorded.</p>;
  }
  return (
    <figure className="globe">
      <svg
        viewBox={`${globeLeft} ${globeTop} ${globeSpan} ${globeHeight}`}
        role="img"
        aria-label={model.summary}
      >
        <Scales />
        {model.detached !== null && <path className="globe-detached" d={areaBetween(model.detached)} />}
        <Anatomy model={model} />
        {model.elements.map((element) => (
          <ElementShape key={element.path} element={element} />
        ))}
        {model.breaks.map((found) => (
          <BreakShape key={found.path} found={found} />
        ))}
      </svg>
      {model.breaks.map((found) => (
        <GlobeHandle key={found.path} found={found} readOnly={readOnly} onMove={move} onOpen={openBreak} />
      ))}
      <span className="sr-only" role="status">
        {said}
      </span>
    </figure>
  );
};
