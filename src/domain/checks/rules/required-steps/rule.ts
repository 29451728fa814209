import { defineRule } from '../../define-rule.ts';
import { listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'required-steps',
  family: 'standards',
  level: 'omission',
  title: 'Steps of the operation of which nothing is said',
  why: 'Not recorded and not done are different things to the next reader.',
  source: { text: 'C-CDA Operative Note: description 29554-3; RC.02.01.03', certainty: 'R' },
  answerable: true,
  check: ({ buckle, vitreous, drainage, retinopexy, tamponade }) => {
    const items = [
      { field: 'buckle.elements', what: 'buckling elements', value: buckle?.elements },
      { field: 'vitreous.vitrectomy', what: 'vitrectomy', value: vitreous?.vitrectomy },
      { field: 'drainage.kind', what: 'drainage', value: drainage?.kind },
      { field: 'retinopexy.treatments', what: 'retinopexy', value: retinopexy?.treatments },
      { field: 'tamponade.agent', what: 'tamponade', value: tamponade?.agent },
    ].filter(({ value }) => value === undefined);
    if (items.length === 0) return [];
    return [
      {
        fields: items.map(({ field }) => field),
        message: `Not recorded, done or not: ${listWords(items.map(({ what }) => what))}.`,
      },
    ];
  },
  examples: {
    fires: [{ name: 'nothing', fields: 'buckle.elements', record: {} }],
    silent: [
      {
        name: 'each said',
        record: {
          buckle: { elements: 'none' },
          vitreous: { vitrectomy: true },
          drainage: { kind: 'internal' },
          retinopexy: { treatments: 'none' },
          tamponade: { agent: 'none' },
        },
      },
    ],
    unknown: [],
  },
});
