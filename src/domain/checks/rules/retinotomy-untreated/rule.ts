import { defineRule } from '../../define-rule.ts';
import { labelOf, retinotomiesOf, treatmentsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'retinotomy-untreated',
  family: 'retinopexy',
  level: 'omission',
  title: 'A retinotomy without retinopexy',
  why: 'A retinotomy is a break.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: (record) =>
    treatmentsOf(record).some(({ targets }) => targets === 'circumferential')
      ? []
      : retinotomiesOf(record).flatMap(({ kind, treatedBy }, index) =>
          kind === undefined || (treatedBy !== undefined && treatedBy !== 'none')
            ? []
            : [
                {
                  fields: [`vitreous.retinotomies.${index}.treatedBy`],
                  message: `${labelOf('vitreous.retinotomies.kind', kind).replace(/^./, (c) => c.toUpperCase())} ${index + 1} is recorded without retinopexy.`,
                },
              ],
        ),
  examples: {
    fires: [
      {
        name: 'not said',
        fields: 'vitreous.retinotomies.0.treatedBy',
        record: { vitreous: { retinotomies: [{ kind: 'drainage' }] } },
      },
    ],
    silent: [
      { name: 'lasered', record: { vitreous: { retinotomies: [{ kind: 'drainage', treatedBy: 'laser' }] } } },
    ],
    unknown: [{ name: 'none recorded', record: { vitreous: { vitrectomy: true } } }],
  },
});
