import { labelOf } from '../../domain/drafting/words.ts';
import { BubbleView } from './BubbleView.tsx';
import { FundusView } from './FundusView.tsx';
import { globeHeight, globeLeft, globeSpan, globeTop } from './globe-model.ts';
import { useDesk } from './use-desk.ts';
import { useGlobeModel } from './use-globe-model.ts';

/** Only so many postures stand beside the fundus; the rest are in the figures under their fields. */
const MOST = 2;

/** The inside of the eye: the fundus, and the bubble in each posture once there is a tamponade. */
export const InsideView = () => {
  const model = useGlobeModel();
  const tamponade = useDesk((state) => state.record.tamponade);
  const aftercare = useDesk((state) => state.record.aftercare);
  const axialLengthMm = useDesk((state) => state.record.before?.axialLengthMm);
  if (model === null)
    return <p className="globe globe-absent">The fundus is drawn here once the eye is recorded.</p>;
  const postures = Array.isArray(aftercare?.posture) ? aftercare.posture : [];
  const positions = postures
    .flatMap(({ position }) => (position === undefined || position === 'free' ? [] : [position]))
    .slice(0, MOST);
  const fillPercent = tamponade?.fillPercent;
  const names = positions.map((position) => labelOf('aftercare.posture.position', position));
  const bubbles = fillPercent === undefined ? [] : positions;
  const summary = `Fundus. ${model.summary}.${bubbles.length > 0 ? ` Bubble of ${fillPercent}%: ${names.join('; ')} (an estimate).` : ''}`;
  return (
    <figure className="globe">
      <svg viewBox={`${globeLeft} ${globeTop} ${globeSpan} ${globeHeight}`} role="img" aria-label={summary}>
        <FundusView model={model} />
        {bubbles.map((position, at) => (
          <g key={position} transform={`translate(${248 + at * 108} 70)`}>
            <BubbleView
              model={model}
              position={position}
              tamponade={{ fill: (fillPercent ?? 0) / 100, sinks: tamponade?.agent === 'heavy-oil' }}
              axialLengthMm={axialLengthMm}
            />
          </g>
        ))}
        {bubbles.length === 0 && (
          <text className="globe-label" x={300} y={78} textAnchor="middle">
            bubble: once fill and posture are recorded
          </text>
        )}
        {bubbles.length > 0 && (
          <text className="globe-label" x={302} y={148} textAnchor="middle">
            {fillPercent}% fill, an estimate
          </text>
        )}
      </svg>
    </figure>
  );
};
