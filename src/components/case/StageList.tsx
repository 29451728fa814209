import { isAnswered, type Level, levels } from '../../domain/checks/flag.ts';
import { stageTitle } from '../../domain/record/field-tree.ts';
import { type Stage, stages } from '../../domain/record/schema.ts';
import type { DeskState } from './desk-store.ts';
import { countInWords, stageOf } from './flag-order.ts';
import { useDesk, useDeskTools } from './use-desk.ts';

const stageFlags = (state: DeskState, stage: Stage): string =>
  levels
    .map(
      (level) =>
        state.flags.filter(
          (flag) => flag.level === level && stageOf(flag) === stage && !isAnswered(flag, state.answers),
        ).length,
    )
    .join(' ');

const progress = (recorded: boolean, counts: readonly number[]) => {
  if (!recorded) return 'empty' as const;
  return (counts[0] ?? 0) + (counts[1] ?? 0) > 0 ? ('half' as const) : ('full' as const);
};

const progressWords = {
  empty: 'nothing recorded',
  half: 'recorded in part',
  full: 'recorded',
} as const;

const StageLink = ({ stage, place }: { stage: Stage; place: number }) => {
  const { store } = useDeskTools();
  const isHere = useDesk((state) => state.stage === stage);
  const recorded = useDesk((state) => state.record[stage] !== undefined);
  const counts = useDesk((state) => stageFlags(state, stage))
    .split(' ')
    .map(Number);
  const how = progress(recorded, counts);
  const found = levels.flatMap((level: Level, index) => {
    const count = counts[index] ?? 0;
    return count === 0 ? [] : [{ level, count }];
  });
  const spoken = [progressWords[how], ...found.map(({ level, count }) => countInWords(count, level))].join(
    ', ',
  );
  return (
    <li>
      <button
        type="button"
        className="stage-link"
        aria-current={isHere ? 'step' : undefined}
        onClick={() => store.goTo(stage)}
      >
        <svg className="stage-dot" viewBox="0 0 12 12" aria-hidden="true">
          <circle cx="6" cy="6" r="4.5" />
          {how === 'full' && <circle cx="6" cy="6" r="4.5" className="filled" />}
          {how === 'half' && <path d="M6 1.5a4.5 4.5 0 0 0 0 9z" className="filled" />}
        </svg>
        <span className="stage-title">{stageTitle(stage)}</span>
        <span className="stage-counts" aria-hidden="true">
          {found.map(({ level, count }) => (
            <span key={level} className={`count-${level}`}>
              {count}
            </span>
          ))}
        </span>
        <span className="sr-only">
          , {spoken}
          {place <= 9 ? `, key ${place}` : ''}
        </span>
      </button>
    </li>
  );
};

/** The stages of the operation, how far each is recorded, and how many flags it has. */
export const StageList = () => (
  <nav className="stages" aria-label="Stages of the record">
    <ol>
      {stages.map((stage, index) => (
        <StageLink key={stage} stage={stage} place={index + 1} />
      ))}
    </ol>
  </nav>
);
