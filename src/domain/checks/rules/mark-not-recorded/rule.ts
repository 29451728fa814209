import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'mark-not-recorded',
  family: 'side',
  level: 'omission',
  title: 'The marking of the eye is not recorded',
  why: 'Mark, consent and time-out are the three chances to catch the wrong side.',
  source: {
    text: 'Universal protocol: site marked before the incision; Elghrably, Eye 2008;22:340',
    certainty: 'M',
  },
  answerable: true,
  check: ({ who }) => {
    if (who?.eye === undefined || who.markedEye !== undefined) return [];
    if (who.consentEye === undefined && who.timeOutEye === undefined) return [];
    return [
      {
        fields: ['who.markedEye'],
        message: `The ${who.eye} eye was operated on; which eye was marked is not recorded.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'no mark',
        fields: 'who.markedEye',
        record: { who: { eye: 'left', consentEye: 'left', timeOutEye: 'left' } },
      },
    ],
    silent: [{ name: 'marked', record: { who: { eye: 'left', consentEye: 'left', markedEye: 'left' } } }],
    unknown: [{ name: 'sides not begun', record: { who: { eye: 'left' } } }],
  },
});
