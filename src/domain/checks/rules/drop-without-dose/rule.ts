import { defineRule } from '../../define-rule.ts';
import { dropsOf, listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'drop-without-dose',
  family: 'medicines',
  level: 'omission',
  title: 'Drops without how often or how long',
  why: 'The family doctor carries on what the letter says.',
  source: { text: 'Academy of Medical Royal Colleges, Please, write to me, 2018', certainty: 'R' },
  answerable: true,
  check: (record) =>
    dropsOf(record).flatMap(({ drug, timesADay, weeks, note }, index) => {
      if (drug === undefined || note !== undefined) return [];
      const missing = [
        timesADay === undefined
          ? { field: `aftercare.drops.${index}.timesADay`, what: 'how often' }
          : undefined,
        weeks === undefined ? { field: `aftercare.drops.${index}.weeks`, what: 'how long' } : undefined,
      ].filter((one) => one !== undefined);
      if (missing.length === 0) return [];
      return [
        {
          fields: missing.map(({ field }) => field),
          message: `${drug} is prescribed without ${listWords(missing.map(({ what }) => what))}.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'name only',
        fields: 'aftercare.drops.0.timesADay',
        record: { aftercare: { drops: [{ drug: 'Dexamethasone' }] } },
      },
    ],
    silent: [
      {
        name: 'complete',
        record: { aftercare: { drops: [{ drug: 'Dexamethasone', timesADay: 4, weeks: 4 }] } },
      },
    ],
    unknown: [{ name: 'no drug', record: { aftercare: { drops: [{ timesADay: 4 }] } } }],
  },
});
