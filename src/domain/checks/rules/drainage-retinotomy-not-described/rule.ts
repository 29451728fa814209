import { defineRule } from '../../define-rule.ts';
import { retinotomiesOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'drainage-retinotomy-not-described',
  family: 'drainage',
  level: 'omission',
  title: 'Drained through a retinotomy that is not described',
  why: 'A retinotomy is a break: where it lies and how it was closed belong in the note.',
  source: { text: 'RC.02.01.03: each finding', certainty: 'R' },
  answerable: true,
  unless: ['drainage-retinotomy-missing'],
  check: (record) => {
    if (record.drainage?.internalThrough !== 'retinotomy') return [];
    if (retinotomiesOf(record).length > 0 || record.vitreous?.retinotomies === 'none') return [];
    return [
      {
        fields: ['vitreous.retinotomies', 'drainage.internalThrough'],
        message: 'Fluid was drained through a drainage retinotomy; the retinotomy is not recorded.',
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'not described',
        fields: 'vitreous.retinotomies',
        record: { drainage: { kind: 'internal', internalThrough: 'retinotomy' } },
      },
    ],
    silent: [
      {
        name: 'described',
        record: {
          drainage: { kind: 'internal', internalThrough: 'retinotomy' },
          vitreous: { retinotomies: [{ kind: 'drainage', treatedBy: 'laser' }] },
        },
      },
    ],
    unknown: [{ name: 'way not recorded', record: { drainage: { kind: 'internal' } } }],
  },
});
