import { defineRule } from '../../define-rule.ts';
import { labelOf, listWords, missingFrom, previousOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'previous-operation-incomplete',
  family: 'diagnosis',
  level: 'omission',
  title: 'An earlier operation without what it was or which eye',
  why: 'An operation on the fellow eye and one on this eye mean different things for plan and code.',
  source: { text: 'Elghrably, Eye 2008;22:340', certainty: 'R' },
  answerable: true,
  check: (record) => {
    const missing = missingFrom(
      previousOf(record).flatMap(({ what, eye }, index) => [
        {
          field: `before.previousOperations.${index}.what`,
          words: `what earlier operation ${index + 1} was`,
          value: what,
        },
        {
          field: `before.previousOperations.${index}.eye`,
          words: `the eye of the ${what === undefined ? `earlier operation ${index + 1}` : `earlier ${labelOf('before.previousOperations.what', what)}`}`,
          value: eye,
        },
      ]),
    );
    if (missing.length === 0) return [];
    return [
      {
        fields: missing.map(({ field }) => field),
        message: `Not recorded: ${listWords(missing.map(({ words }) => words))}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'which eye',
        fields: 'before.previousOperations.0.eye',
        record: { before: { previousOperations: [{ what: 'cataract' }] } },
      },
    ],
    silent: [
      { name: 'complete', record: { before: { previousOperations: [{ what: 'cataract', eye: 'left' }] } } },
      { name: 'none', record: { before: { previousOperations: 'none' } } },
    ],
    unknown: [{ name: 'history not recorded', record: { before: { lens: 'pseudophakic' } } }],
  },
});
