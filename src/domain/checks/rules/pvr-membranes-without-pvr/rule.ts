import { defineRule } from '../../define-rule.ts';
import { labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'pvr-membranes-without-pvr',
  family: 'diagnosis',
  level: 'contradiction',
  title: 'PVR membranes were peeled, and PVR is graded none or A',
  why: 'A detachment with membranes peeled is the complex code only where PVR is C-1 or worse.',
  source: { text: 'CPT 67113: PVR C-1 or worse with vitrectomy and membrane peel', certainty: 'R' },
  answerable: false,
  check: ({ before, vitreous }) => {
    const grade = before?.pvr?.grade;
    const peeled = vitreous?.membranesPeeled?.find((one) => one === 'preretinal' || one === 'subretinal');
    if ((grade !== 'none' && grade !== 'A') || peeled === undefined) return [];
    return [
      {
        fields: ['before.pvr.grade', 'vitreous.membranesPeeled'],
        message: `PVR is graded ${grade}; ${labelOf('vitreous.membranesPeeled', peeled)} are recorded as peeled.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'no PVR, membranes peeled',
        fields: 'before.pvr.grade',
        record: { before: { pvr: { grade: 'none' } }, vitreous: { membranesPeeled: ['preretinal'] } },
      },
    ],
    silent: [
      {
        name: 'epiretinal membrane without PVR',
        record: { before: { pvr: { grade: 'none' } }, vitreous: { membranesPeeled: ['epiretinal', 'ilm'] } },
      },
      {
        name: 'grade C',
        record: { before: { pvr: { grade: 'CP' } }, vitreous: { membranesPeeled: ['preretinal'] } },
      },
    ],
    unknown: [{ name: 'not graded', record: { vitreous: { membranesPeeled: ['preretinal'] } } }],
  },
});
