import type { FieldSpec } from '../../domain/record/field-tree.ts';
import { type FieldPath, valueAt } from '../../domain/record/paths.ts';
import { useDesk, useDeskTools } from './use-desk.ts';

interface Props {
  spec: FieldSpec;
  path: FieldPath;
  compact?: boolean;
}

const denying = ['none', 'not-applicable'];
const shortWords: Readonly<Record<string, string>> = { 'not-applicable': 'n/a' };

/**
 * "None", "not applicable" and their like: said by a press, taken back by another. Words that deny a value are not
 * offered beside one.
 */
export const WordButtons = ({ spec, path, compact = false }: Props) => {
  const { store, readOnly } = useDeskTools();
  const recorded = useDesk((state) => {
    const found = valueAt(state.record, path);
    if (found === undefined) return '';
    return typeof found === 'string' && Object.hasOwn(spec.words, found) ? found : 'a value';
  });
  return Object.entries(spec.words)
    .filter(([word]) => recorded !== 'a value' || !denying.includes(word))
    .map(([word, label]) => (
      <button
        key={word}
        type="button"
        className="case-word"
        aria-pressed={recorded === word}
        aria-label={`${spec.title}: ${label}`}
        disabled={readOnly}
        onClick={() => store.record(path, recorded === word ? undefined : word)}
      >
        {compact ? (shortWords[word] ?? label) : label}
      </button>
    ));
};
