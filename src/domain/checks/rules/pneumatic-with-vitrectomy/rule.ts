import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'pneumatic-with-vitrectomy',
  family: 'tamponade',
  level: 'contradiction',
  title: 'Pneumatic retinopexy and vitrectomy in one operation',
  why: 'They are two operations with two codes; after a vitrectomy gas is a tamponade.',
  source: { text: 'CPT 67110 against 67108', certainty: 'R' },
  answerable: false,
  check: (record) =>
    record.who?.performed?.includes('pneumatic-retinopexy') === true &&
    (record.vitreous?.vitrectomy === true || record.who.performed.includes('vitrectomy'))
      ? [
          {
            fields: ['who.performed', 'vitreous.vitrectomy'],
            message: 'Pneumatic retinopexy and vitrectomy are both recorded as performed.',
          },
        ]
      : [],
  examples: {
    fires: [
      {
        name: 'both',
        fields: 'who.performed',
        record: { who: { performed: ['pneumatic-retinopexy', 'vitrectomy'] } },
      },
    ],
    silent: [
      {
        name: 'pneumatic alone',
        record: { who: { performed: ['pneumatic-retinopexy'] }, vitreous: { vitrectomy: false } },
      },
    ],
    unknown: [{ name: 'vitrectomy not recorded', record: { who: { performed: ['pneumatic-retinopexy'] } } }],
  },
});
