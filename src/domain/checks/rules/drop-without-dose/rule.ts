import { defineRule } from '../../define-rule.ts';
import { capital, dropsOf, listWords, missingFrom, numberWords, tabletsOf, timesWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'drop-without-dose',
  family: 'medicines',
  level: 'omission',
  title: 'Drops or tablets without their name, how often or how long',
  why: 'The family doctor carries on what the letter says.',
  source: { text: 'Academy of Medical Royal Colleges, Please, write to me, 2018', certainty: 'R' },
  answerable: true,
  check: (record) =>
    [
      ...dropsOf(record).map((one, index) => ({ ...one, base: `aftercare.drops.${index}` })),
      ...tabletsOf(record).map((one, index) => ({ ...one, base: `aftercare.tablets.${index}` })),
    ].flatMap(({ drug, timesADay, weeks, note, base }) => {
      if (drug === undefined) {
        if (timesADay === undefined && weeks === undefined) return [];
        const often =
          timesADay === undefined ? `for ${numberWords(weeks ?? 0)} weeks` : `${timesWords(timesADay)} a day`;
        return [{ fields: [`${base}.drug`], message: `A drug ${often} is prescribed without its name.` }];
      }
      if (note !== undefined) return [];
      const missing = missingFrom([
        { field: `${base}.timesADay`, what: 'how often', value: timesADay },
        { field: `${base}.weeks`, what: 'how long', value: weeks },
      ]);
      if (missing.length === 0) return [];
      return [
        {
          fields: missing.map(({ field }) => field),
          message: `${capital(drug)} is prescribed without ${listWords(missing.map(({ what }) => what))}.`,
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
      {
        name: 'four times a day of what',
        fields: 'aftercare.drops.0.drug',
        record: { aftercare: { drops: [{ timesADay: 4 }] } },
      },
      {
        name: 'tablets',
        fields: 'aftercare.tablets.0.weeks',
        record: { aftercare: { tablets: [{ drug: 'Acetazolamide', timesADay: 2 }] } },
      },
    ],
    silent: [
      {
        name: 'complete',
        record: { aftercare: { drops: [{ drug: 'Dexamethasone', timesADay: 4, weeks: 4 }] } },
      },
      {
        name: 'when needed',
        record: { aftercare: { tablets: [{ drug: 'Paracetamol', note: 'when needed' }] } },
      },
    ],
    unknown: [{ name: 'no drug', record: { aftercare: { drops: [{ strength: '0.1%' }] } } }],
  },
});
