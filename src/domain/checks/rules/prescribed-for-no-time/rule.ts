import { defineRule } from '../../define-rule.ts';
import { capital, dropsOf, tabletsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'prescribed-for-no-time',
  family: 'medicines',
  level: 'contradiction',
  title: 'A drug prescribed for no time at all',
  why: 'The family doctor reads a drug and a nought.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: (record) =>
    [
      ...dropsOf(record).map((one, index) => ({ ...one, base: `aftercare.drops.${index}` })),
      ...tabletsOf(record).map((one, index) => ({ ...one, base: `aftercare.tablets.${index}` })),
    ].flatMap(({ drug, timesADay, weeks, base }) => {
      if (drug === undefined) return [];
      if (timesADay === 0)
        return [{ fields: [`${base}.timesADay`], message: `${capital(drug)} is prescribed 0 times a day.` }];
      return weeks === 0
        ? [{ fields: [`${base}.weeks`], message: `${capital(drug)} is prescribed for 0 weeks.` }]
        : [];
    }),
  examples: {
    fires: [
      {
        name: 'never',
        fields: 'aftercare.drops.0.timesADay',
        record: { aftercare: { drops: [{ drug: 'Dexamethasone', timesADay: 0 }] } },
      },
    ],
    silent: [
      {
        name: 'four times',
        record: { aftercare: { drops: [{ drug: 'Dexamethasone', timesADay: 4, weeks: 4 }] } },
      },
    ],
    unknown: [
      { name: 'how often not recorded', record: { aftercare: { drops: [{ drug: 'Dexamethasone' }] } } },
    ],
  },
});
