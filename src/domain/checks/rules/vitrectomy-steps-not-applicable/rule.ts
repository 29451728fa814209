import { defineRule } from '../../define-rule.ts';
import { listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'vitrectomy-steps-not-applicable',
  family: 'vitreous',
  level: 'contradiction',
  title: 'A vitrectomy whose ports, gauge or closure do not apply',
  why: 'Every vitrectomy has ports; a field left over from another operation misleads.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: ({ vitreous }) => {
    if (vitreous?.vitrectomy !== true) return [];
    const wrong = [
      { field: 'vitreous.ports', what: 'ports', value: vitreous.ports },
      { field: 'vitreous.gauge', what: 'gauge', value: vitreous.gauge },
      {
        field: 'vitreous.sclerotomyClosure',
        what: 'closure of the sclerotomies',
        value: vitreous.sclerotomyClosure,
      },
    ].filter(({ value }) => value === 'not-applicable');
    if (wrong.length === 0) return [];
    return [
      {
        fields: [...wrong.map(({ field }) => field), 'vitreous.vitrectomy'],
        message: `A vitrectomy is recorded, with ${listWords(wrong.map(({ what }) => what))} as not applicable.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'no gauge',
        fields: 'vitreous.gauge',
        record: { vitreous: { vitrectomy: true, gauge: 'not-applicable' } },
      },
    ],
    silent: [
      { name: 'buckle', record: { vitreous: { vitrectomy: false, gauge: 'not-applicable' } } },
      { name: '25 gauge', record: { vitreous: { vitrectomy: true, gauge: '25' } } },
    ],
    unknown: [{ name: 'vitrectomy not recorded', record: { vitreous: { gauge: 'not-applicable' } } }],
  },
});
