import { defineRule } from '../../define-rule.ts';
import { capital, dropsOf, tabletsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'prescribed-twice',
  family: 'medicines',
  level: 'caution',
  title: 'The same drug prescribed twice',
  why: 'Two lines of one drug are read as two bottles; a course that is tapered says so in a note.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: (record) =>
    [
      { list: 'drops', items: dropsOf(record).map(({ drug, note, strength }) => ({ drug, note, strength })) },
      {
        list: 'tablets',
        items: tabletsOf(record).map(({ drug, note, strength }) => ({ drug, note, strength })),
      },
    ].flatMap(({ list, items }) =>
      items.flatMap(({ drug, note, strength }, index) => {
        const first = items.findIndex(
          (one) => one.drug?.toLowerCase() === drug?.toLowerCase() && one.strength === strength,
        );
        if (drug === undefined || note !== undefined || first === index) return [];
        return [
          {
            fields: [`aftercare.${list}.${index}.drug`, `aftercare.${list}.${first}.drug`],
            message: `${capital(drug)} is prescribed twice.`,
          },
        ];
      }),
    ),
  examples: {
    fires: [
      {
        name: 'twice',
        fields: 'aftercare.drops.1.drug',
        record: {
          aftercare: {
            drops: [
              { drug: 'Prednisolone', timesADay: 4 },
              { drug: 'prednisolone', timesADay: 2 },
            ],
          },
        },
      },
    ],
    silent: [
      {
        name: 'tapered',
        record: {
          aftercare: {
            drops: [
              { drug: 'Prednisolone', timesADay: 4 },
              { drug: 'Prednisolone', timesADay: 2, note: 'afterwards' },
            ],
          },
        },
      },
    ],
    unknown: [
      { name: 'drug not recorded', record: { aftercare: { drops: [{ timesADay: 4 }, { timesADay: 2 }] } } },
    ],
  },
});
