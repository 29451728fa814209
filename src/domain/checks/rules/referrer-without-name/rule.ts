import { defineRule } from '../../define-rule.ts';
import { labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'referrer-without-name',
  family: 'letters',
  level: 'omission',
  title: 'Referred by somebody who is not named',
  why: 'Referring optometrists had a reply in 38 to 62%; a letter needs a reader.',
  source: { text: 'Trade figures on replies to optometrists', certainty: 'R2' },
  answerable: true,
  unless: ['referrer-missing'],
  check: ({ who }) => {
    const { kind, name } = who?.referrer ?? {};
    if (kind === undefined || kind === 'self' || kind === 'emergency-department' || name !== undefined)
      return [];
    return [
      {
        fields: ['who.referrer.name'],
        message: `The patient was referred by ${kind === 'optometrist' || kind === 'ophthalmologist' ? 'an' : 'a'} ${labelOf('who.referrer.kind', kind)}; the name is not recorded.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'optometrist not named',
        fields: 'who.referrer.name',
        record: { who: { referrer: { kind: 'optometrist' }, familyDoctor: 'D. Hallowsedge' } },
      },
    ],
    silent: [
      { name: 'came without referral', record: { who: { referrer: { kind: 'self' } } } },
      { name: 'named', record: { who: { referrer: { kind: 'optometrist', name: 'E. Quillfeather' } } } },
    ],
    unknown: [{ name: 'referral not recorded', record: { who: { familyDoctor: 'D. Hallowsedge' } } }],
  },
});
