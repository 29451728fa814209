import { defineRule } from '../../define-rule.ts';
import { treatmentsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'cryo-all-round',
  family: 'retinopexy',
  level: 'caution',
  title: 'Cryotherapy all round',
  why: 'Extensive cryotherapy is said to feed PVR; all round it is usually laser.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: (record) => {
    const index = treatmentsOf(record).findIndex(
      ({ modality, targets }) => modality === 'cryo' && targets === 'circumferential',
    );
    return index < 0
      ? []
      : [
          {
            fields: [`retinopexy.treatments.${index}.targets`, `retinopexy.treatments.${index}.modality`],
            message: 'Cryotherapy is recorded over 360°.',
          },
        ];
  },
  examples: {
    fires: [
      {
        name: 'all round',
        fields: 'retinopexy.treatments.0.targets',
        record: { retinopexy: { treatments: [{ modality: 'cryo', targets: 'circumferential' }] } },
      },
    ],
    silent: [
      {
        name: 'laser all round',
        record: { retinopexy: { treatments: [{ modality: 'endolaser', targets: 'circumferential' }] } },
      },
    ],
    unknown: [
      { name: 'kind not recorded', record: { retinopexy: { treatments: [{ targets: 'circumferential' }] } } },
    ],
  },
});
