import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'referrer-missing',
  family: 'letters',
  level: 'omission',
  title: 'Nobody is named whom the letter goes to',
  why: 'Referring optometrists had a reply in 38 to 62%.',
  source: { text: 'Trade figures on replies to optometrists', certainty: 'R2' },
  answerable: true,
  check: ({ who, endOfCase }) => {
    // Asked once the end of the case is being recorded: before, the list may still be completed.
    if (
      endOfCase === undefined ||
      who?.referrer?.name !== undefined ||
      who?.referrer?.kind === 'self' ||
      who?.familyDoctor !== undefined
    )
      return [];
    return [
      {
        fields: ['who.referrer.name', 'who.familyDoctor'],
        message: 'Neither the referring doctor nor the family doctor is named; the letter has no reader.',
      },
    ];
  },
  examples: {
    fires: [{ name: 'nobody', fields: 'who.referrer.name', record: { endOfCase: { retina: 'flat' } } }],
    silent: [
      {
        name: 'came without referral',
        record: { who: { referrer: { kind: 'self' } }, endOfCase: { retina: 'flat' } },
      },
    ],
    unknown: [{ name: 'case not ended', record: { who: { eye: 'left' } } }],
  },
});
