import { defineRule } from '../../define-rule.ts';
import { labelOf, listWords, retinotomiesOf, treatmentsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'retinotomy-treated-without-retinopexy',
  family: 'retinopexy',
  level: 'contradiction',
  title: 'A retinotomy is recorded as treated by what was not used',
  why: 'A retinotomy that is only thought to be treated opens again.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: (record) => {
    const treatments = record.retinopexy?.treatments;
    const all = treatmentsOf(record);
    if (treatments === undefined || all.some(({ modality }) => modality === undefined)) return [];
    const used = new Set(
      all.map(({ modality }) => (modality === 'cryo' || modality === 'diathermy' ? modality : 'laser')),
    );
    return retinotomiesOf(record).flatMap(({ treatedBy }, index) => {
      if (treatedBy === undefined || treatedBy === 'none' || used.has(treatedBy)) return [];
      return [
        {
          fields: [`vitreous.retinotomies.${index}.treatedBy`, 'retinopexy.treatments'],
          message: `Retinotomy ${index + 1} is recorded as treated by ${labelOf('vitreous.retinotomies.treatedBy', treatedBy)}; the retinopexy recorded is ${used.size === 0 ? 'none' : listWords([...used].map((one) => labelOf('breaks.found.treatedBy', one)))}.`,
        },
      ];
    });
  },
  examples: {
    fires: [
      {
        name: 'no retinopexy',
        fields: 'vitreous.retinotomies.0.treatedBy',
        record: {
          vitreous: { retinotomies: [{ kind: 'drainage', treatedBy: 'laser' }] },
          retinopexy: { treatments: 'none' },
        },
      },
    ],
    silent: [
      {
        name: 'laser',
        record: {
          vitreous: { retinotomies: [{ kind: 'drainage', treatedBy: 'laser' }] },
          retinopexy: { treatments: [{ modality: 'endolaser' }] },
        },
      },
    ],
    unknown: [
      {
        name: 'retinopexy not recorded',
        record: { vitreous: { retinotomies: [{ kind: 'drainage', treatedBy: 'laser' }] } },
      },
    ],
  },
});
