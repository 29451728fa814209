import { defineRule } from '../../define-rule.ts';
import { capital, labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'pvr-not-graded',
  family: 'diagnosis',
  level: 'omission',
  title: 'PVR membranes were peeled, and PVR is not graded',
  why: 'The grade decides between the simple and the complex code, and what the auditor counts.',
  source: { text: 'CPT 67113: PVR C-1 or worse with vitrectomy and membrane peel', certainty: 'R' },
  answerable: true,
  check: ({ before, vitreous }) => {
    const peeled = vitreous?.membranesPeeled?.find((one) => one === 'preretinal' || one === 'subretinal');
    if (peeled === undefined || before?.pvr?.grade !== undefined) return [];
    return [
      {
        fields: ['before.pvr.grade', 'vitreous.membranesPeeled'],
        message: `${capital(labelOf('vitreous.membranesPeeled', peeled))} were peeled; PVR is not graded.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'not graded',
        fields: 'before.pvr.grade',
        record: { vitreous: { membranesPeeled: ['preretinal'] } },
      },
    ],
    silent: [
      {
        name: 'graded',
        record: { before: { pvr: { grade: 'CP' } }, vitreous: { membranesPeeled: ['preretinal'] } },
      },
      { name: 'limiting membrane', record: { vitreous: { membranesPeeled: ['ilm'] } } },
    ],
    unknown: [{ name: 'membranes not recorded', record: { vitreous: { vitrectomy: true } } }],
  },
});
