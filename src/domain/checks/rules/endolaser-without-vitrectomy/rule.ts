import { defineRule } from '../../define-rule.ts';
import { treatmentsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'endolaser-without-vitrectomy',
  family: 'retinopexy',
  level: 'contradiction',
  title: 'Endolaser without vitrectomy',
  why: 'Endolaser needs a probe inside the eye; the vitrectomy or the kind of laser is a slip.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: false,
  check: (record) => {
    const index = treatmentsOf(record).findIndex(({ modality }) => modality === 'endolaser');
    if (index < 0 || record.vitreous?.vitrectomy !== false) return [];
    return [
      {
        fields: [`retinopexy.treatments.${index}.modality`, 'vitreous.vitrectomy'],
        message: 'Endolaser is recorded, and vitrectomy as not performed.',
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'no vitrectomy',
        fields: 'retinopexy.treatments.0.modality',
        record: { vitreous: { vitrectomy: false }, retinopexy: { treatments: [{ modality: 'endolaser' }] } },
      },
    ],
    silent: [
      {
        name: 'vitrectomy',
        record: { vitreous: { vitrectomy: true }, retinopexy: { treatments: [{ modality: 'endolaser' }] } },
      },
      {
        name: 'indirect laser',
        record: {
          vitreous: { vitrectomy: false },
          retinopexy: { treatments: [{ modality: 'indirect-laser' }] },
        },
      },
    ],
    unknown: [
      {
        name: 'vitrectomy not recorded',
        record: { retinopexy: { treatments: [{ modality: 'endolaser' }] } },
      },
    ],
  },
});
