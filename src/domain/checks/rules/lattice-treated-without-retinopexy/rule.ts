import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'lattice-treated-without-retinopexy',
  family: 'retinopexy',
  level: 'contradiction',
  title: 'Lattice is recorded as treated, and retinopexy as none',
  why: 'The next surgeon relies on what was treated.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: (record) => {
    const lattice = Array.isArray(record.breaks?.lattice) ? record.breaks.lattice : [];
    const index = lattice.findIndex(({ treated }) => treated === true);
    if (index < 0 || record.retinopexy?.treatments !== 'none') return [];
    return [
      {
        fields: [`breaks.lattice.${index}.treated`, 'retinopexy.treatments'],
        message: `Lattice patch ${index + 1} is recorded as treated, and retinopexy as none.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'no retinopexy',
        fields: 'breaks.lattice.0.treated',
        record: {
          breaks: { lattice: [{ fromClock: 5, toClock: 7, treated: true }] },
          retinopexy: { treatments: 'none' },
        },
      },
    ],
    silent: [
      {
        name: 'laser',
        record: {
          breaks: { lattice: [{ fromClock: 5, toClock: 7, treated: true }] },
          retinopexy: { treatments: [{ modality: 'endolaser' }] },
        },
      },
    ],
    unknown: [{ name: 'retinopexy not recorded', record: { breaks: { lattice: [{ treated: true }] } } }],
  },
});
