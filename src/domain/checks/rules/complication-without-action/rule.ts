import { defineRule } from '../../define-rule.ts';
import { complicationsOf, labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'complication-without-action',
  family: 'standards',
  level: 'omission',
  title: 'A complication without what was done about it',
  why: 'What was done is what a reader looks for first.',
  source: { text: 'Royal College of Surgeons of England, Good Surgical Practice 2014', certainty: 'R2' },
  answerable: true,
  check: (record) =>
    complicationsOf(record).flatMap(({ kind, detail, action }, index) => {
      if (action !== undefined || (kind === undefined && detail === undefined)) return [];
      const name =
        kind === undefined || kind === 'other'
          ? (detail ?? 'other')
          : labelOf('endOfCase.complications.kind', kind);
      return [
        {
          fields: [`endOfCase.complications.${index}.action`],
          message: `A complication is recorded, ${name}; what was done is not.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'iatrogenic break',
        fields: 'endOfCase.complications.0.action',
        record: { endOfCase: { complications: [{ kind: 'iatrogenic-break' }] } },
      },
    ],
    silent: [
      {
        name: 'treated',
        record: { endOfCase: { complications: [{ kind: 'iatrogenic-break', action: 'lasered' }] } },
      },
    ],
    unknown: [{ name: 'not recorded', record: { endOfCase: {} } }],
  },
});
