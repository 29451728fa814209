import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'pvr-extent-missing',
  family: 'diagnosis',
  level: 'omission',
  title: 'PVR of grade C of 1991 without its clock hours',
  why: 'The 1991 grade is not complete without its extent.',
  source: { text: 'Retina Society 1991: CP or CA with 1–12 clock hours', certainty: 'R' },
  answerable: true,
  check: ({ before }) => {
    const { grade, clockHours } = before?.pvr ?? {};
    if ((grade !== 'CP' && grade !== 'CA') || clockHours !== undefined) return [];
    return [
      {
        fields: ['before.pvr.clockHours'],
        message: `PVR is graded ${grade}; its clock hours are not recorded.`,
      },
    ];
  },
  examples: {
    fires: [
      { name: 'CP alone', fields: 'before.pvr.clockHours', record: { before: { pvr: { grade: 'CP' } } } },
    ],
    silent: [{ name: 'CP 4', record: { before: { pvr: { grade: 'CP', clockHours: 4 } } } }],
    unknown: [{ name: 'no grade', record: { before: { pvr: { edition: '1991' } } } }],
  },
});
