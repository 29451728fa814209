import { defineRule } from '../../define-rule.ts';
import { capital, dropsOf, listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'drop-without-eye',
  family: 'side',
  level: 'omission',
  title: 'Drops without the eye they are for',
  why: 'Of 100 ophthalmic notes 32 transposed the side; a drop without one is put in either.',
  source: { text: 'Elghrably, Eye 2008;22:340', certainty: 'R' },
  answerable: true,
  check: (record) => {
    const bare = dropsOf(record).flatMap(({ drug, eye }, index) =>
      drug !== undefined && eye === undefined ? [{ drug, index }] : [],
    );
    if (bare.length === 0) return [];
    return [
      {
        fields: bare.map(({ index }) => `aftercare.drops.${index}.eye`),
        message: `${capital(listWords(bare.map(({ drug }) => drug)))} ${bare.length === 1 ? 'is' : 'are'} prescribed; for which eye is not recorded.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'no eye',
        fields: 'aftercare.drops.0.eye',
        record: { aftercare: { drops: [{ drug: 'Prednisolone' }] } },
      },
    ],
    silent: [{ name: 'left eye', record: { aftercare: { drops: [{ drug: 'Prednisolone', eye: 'left' }] } } }],
    unknown: [{ name: 'drops not recorded', record: { aftercare: { reviewInDays: 1 } } }],
  },
});
