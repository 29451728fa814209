import { defineRule } from '../../define-rule.ts';
import { listWords, missingFrom, treatmentsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'retinopexy-incomplete',
  family: 'retinopexy',
  level: 'omission',
  title: 'Retinopexy without its kind or what it was applied to',
  why: 'Laser holds from about a day, cryotherapy later; which break was treated is the point of the note.',
  source: { text: 'Laser holds from about a day; cryo is weaker in the first week', certainty: 'R' },
  answerable: true,
  check: (record) => {
    const missing = missingFrom(
      treatmentsOf(record).flatMap(({ modality, targets }, index) => [
        {
          field: `retinopexy.treatments.${index}.modality`,
          what: `the kind of treatment ${index + 1}`,
          value: modality,
        },
        {
          field: `retinopexy.treatments.${index}.targets`,
          what: `what treatment ${index + 1} was applied to`,
          value: targets,
        },
      ]),
    );
    if (missing.length === 0) return [];
    return [
      {
        fields: missing.map(({ field }) => field),
        message: `Retinopexy is recorded without ${listWords(missing.map(({ what }) => what))}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'to what',
        fields: 'retinopexy.treatments.0.targets',
        record: { retinopexy: { treatments: [{ modality: 'cryo' }] } },
      },
      {
        name: 'which kind',
        fields: 'retinopexy.treatments.0.modality',
        record: { retinopexy: { treatments: [{ targets: 'all-breaks' }] } },
      },
    ],
    silent: [
      {
        name: 'complete',
        record: { retinopexy: { treatments: [{ modality: 'cryo', targets: 'all-breaks' }] } },
      },
      { name: 'none', record: { retinopexy: { treatments: 'none' } } },
    ],
    unknown: [{ name: 'retinopexy not recorded', record: { breaks: { found: 'none' } } }],
  },
});
