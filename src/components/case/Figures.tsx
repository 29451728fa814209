import { useId, useState } from 'react';
import type { Figure } from '../../domain/physics/figure.ts';
import { useDesk } from './use-desk.ts';

const inputsInWords = (inputs: Figure['inputs']) =>
  Object.entries(inputs)
    .map(([name, value]) => `${name} ${value}`)
    .join(', ');

const FigureLine = ({ figure }: { figure: Figure }) => {
  const [shown, setShown] = useState(false);
  const id = useId();
  return (
    <p className="figure-line">
      {figure.sentence}{' '}
      <button
        type="button"
        className="figure-why"
        aria-expanded={shown}
        aria-controls={id}
        aria-label={`How this was computed: ${figure.name}`}
        onClick={() => setShown(!shown)}
      >
        how
      </button>
      <span id={id} className="figure-explained" hidden={!shown}>
        {figure.formula}, with {inputsInWords(figure.inputs)}.
        {figure.assumed.length > 0 && ` Assumed, because nothing is recorded: ${figure.assumed.join('; ')}.`}{' '}
        <cite>{figure.source}</cite>
      </span>
    </p>
  );
};

/** What the product computed from the fields of a row. `paths` is a list with spaces between. */
export const Figures = ({ paths }: { paths: string }) => {
  const wanted = paths.split(' ');
  const figures = useDesk((state) => state.figures);
  const here = figures.filter((figure) => wanted.includes(figure.fields[0] ?? ''));
  return here.map((figure) => <FigureLine key={`${figure.id} ${figure.fields[0]}`} figure={figure} />);
};
