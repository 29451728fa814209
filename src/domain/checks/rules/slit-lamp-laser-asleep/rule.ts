import { defineRule } from '../../define-rule.ts';
import { treatmentsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'slit-lamp-laser-asleep',
  family: 'retinopexy',
  level: 'caution',
  title: 'Slit-lamp laser under general anaesthesia',
  why: 'A patient asleep does not sit at a slit lamp; the kind of laser may be a slip.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: (record) => {
    const index = treatmentsOf(record).findIndex(({ modality }) => modality === 'slit-lamp-laser');
    if (index < 0 || record.anaesthesia?.kind !== 'general') return [];
    return [
      {
        fields: [`retinopexy.treatments.${index}.modality`, 'anaesthesia.kind'],
        message: 'Slit-lamp laser is recorded, with general anaesthesia.',
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'asleep',
        fields: 'retinopexy.treatments.0.modality',
        record: {
          anaesthesia: { kind: 'general' },
          retinopexy: { treatments: [{ modality: 'slit-lamp-laser' }] },
        },
      },
    ],
    silent: [
      {
        name: 'under drops',
        record: {
          anaesthesia: { kind: 'topical' },
          retinopexy: { treatments: [{ modality: 'slit-lamp-laser' }] },
        },
      },
    ],
    unknown: [
      {
        name: 'anaesthesia not recorded',
        record: { retinopexy: { treatments: [{ modality: 'slit-lamp-laser' }] } },
      },
    ],
  },
});
