import { useState } from 'react';
import type { Figure } from '../../domain/physics/numbers.ts';
import { useDesk } from './use-desk.ts';

const FigureLine = ({ figure }: { figure: Figure }) => {
  const [shown, setShown] = useState(false);
  return (
    <p className="figure-line">
      {figure.sentence}{' '}
      <button type="button" className="figure-why" aria-expanded={shown} onClick={() => setShown(!shown)}>
        why
      </button>
      {shown && <span className="figure-explained">{figure.formula}</span>}
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
