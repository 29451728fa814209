import { defineRule } from '../../define-rule.ts';
import { labelOf, listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'plan-changed-without-reason',
  family: 'standards',
  level: 'omission',
  title: 'Another operation than planned, without why',
  why: 'The patient consented to the plan; a change needs its reason.',
  source: {
    text: 'Royal College of Surgeons of England, Good Surgical Practice 2014: extra procedures and why',
    certainty: 'R2',
  },
  answerable: true,
  check: ({ who }) => {
    const { planned, performed, whyChanged } = who ?? {};
    if (planned === undefined || performed === undefined || whyChanged !== undefined) return [];
    const major = [
      'encircling-band',
      'segmental-buckle',
      'vitrectomy',
      'pneumatic-retinopexy',
      'oil',
      'lens-removal',
      'retinotomy',
      'oil-removal',
      'element-removal',
    ];
    const added = performed.filter((one) => major.includes(one) && !planned.includes(one));
    const left = planned.filter((one) => major.includes(one) && !performed.includes(one));
    if (added.length === 0 && left.length === 0) return [];
    const names = (list: readonly string[]) => listWords(list.map((one) => labelOf('who.performed', one)));
    const parts = [
      added.length > 0 ? `${names(added)} was not planned` : '',
      left.length > 0 ? `${names(left)} was planned and not done` : '',
    ];
    return [
      {
        fields: ['who.whyChanged', 'who.performed', 'who.planned'],
        message: `The operation differs from the plan: ${parts.filter((part) => part !== '').join('; ')}. Why is not recorded.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'vitrectomy added',
        fields: 'who.whyChanged',
        record: { who: { planned: ['encircling-band'], performed: ['encircling-band', 'vitrectomy'] } },
      },
    ],
    silent: [
      { name: 'as planned', record: { who: { planned: ['vitrectomy'], performed: ['vitrectomy', 'gas'] } } },
    ],
    unknown: [{ name: 'plan not recorded', record: { who: { performed: ['vitrectomy'] } } }],
  },
});
