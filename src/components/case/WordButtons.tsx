import type { FieldSpec } from '../../domain/record/field-tree.ts';
import { type FieldPath, valueAt } from '../../domain/record/paths.ts';
import { useDesk, useDeskTools } from './use-desk.ts';

interface Props {
  spec: FieldSpec;
  path: FieldPath;
  compact?: boolean;
}

const shortWords: Readonly<Record<string, string>> = { 'not-applicable': 'n/a' };

/** "None", "not applicable" and their like: said by a press, taken back by another. */
export const WordButtons = ({ spec, path, compact = false }: Props) => {
  const { store, readOnly } = useDeskTools();
  const value = useDesk((state) => {
    const found = valueAt(state.record, path);
    return typeof found === 'string' ? found : undefined;
  });
  return Object.entries(spec.words).map(([word, label]) => (
    <button
      key={word}
      type="button"
      className="case-word"
      aria-pressed={value === word}
      aria-label={`${spec.title}: ${label}`}
      disabled={readOnly}
      onClick={() => store.record(path, value === word ? undefined : word)}
    >
      {compact ? (shortWords[word] ?? label) : label}
    </button>
  ));
};
