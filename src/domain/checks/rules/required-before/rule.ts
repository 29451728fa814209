import { defineRule } from '../../define-rule.ts';
import { listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'required-before',
  family: 'standards',
  level: 'omission',
  title: 'Diagnosis and findings before are not complete',
  why: 'The diagnosis and the state of the macula are why the operation was done.',
  source: { text: 'C-CDA Operative Note: preoperative diagnosis 10219-4; tag A-0959', certainty: 'R' },
  answerable: true,
  check: ({ before }) => {
    const detached = before?.diagnosis !== 'break-without-detachment';
    const items = [
      { field: 'before.diagnosis', what: 'the preoperative diagnosis', value: before?.diagnosis },
      { field: 'before.macula', what: 'the macula', value: detached ? before?.macula : 'on' },
      { field: 'before.lens', what: 'the lens', value: before?.lens },
      {
        field: 'before.detachmentFromClock',
        what: 'the extent of the detachment',
        value:
          !detached || before?.totalDetachment === true
            ? true
            : (before?.detachmentFromClock ?? before?.quadrantsDetached),
      },
    ].filter(({ value }) => value === undefined);
    if (items.length === 0) return [];
    return [
      {
        fields: items.map(({ field }) => field),
        message: `Not recorded: ${listWords(items.map(({ what }) => what))}.`,
      },
    ];
  },
  examples: {
    fires: [{ name: 'nothing', fields: 'before.diagnosis', record: {} }],
    silent: [
      {
        name: 'complete',
        record: {
          before: { diagnosis: 'rhegmatogenous', macula: 'off', lens: 'phakic', totalDetachment: true },
        },
      },
    ],
    unknown: [],
  },
});
