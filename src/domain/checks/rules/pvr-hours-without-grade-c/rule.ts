import { defineRule } from '../../define-rule.ts';
import { numberIn } from '../../facts.ts';

export const rule = defineRule({
  id: 'pvr-hours-without-grade-c',
  family: 'diagnosis',
  level: 'contradiction',
  title: 'Clock hours of PVR with a grade that has none',
  why: 'Only grade C is counted in clock hours; the grade decides the code.',
  source: { text: 'Retina Society 1991: CP or CA with 1–12 clock hours', certainty: 'R' },
  answerable: false,
  check: ({ before }) => {
    const { grade, clockHours } = before?.pvr ?? {};
    const hours = numberIn(clockHours);
    if ((grade !== 'none' && grade !== 'A' && grade !== 'B') || hours === undefined || hours === 0) return [];
    return [
      {
        fields: ['before.pvr.clockHours', 'before.pvr.grade'],
        message: `PVR is recorded as ${grade === 'none' ? 'none' : `grade ${grade}`}, over ${hours} clock hours.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'grade A over three hours',
        fields: 'before.pvr.clockHours',
        record: { before: { pvr: { grade: 'A', clockHours: 3 } } },
      },
    ],
    silent: [
      { name: 'grade B', record: { before: { pvr: { grade: 'B', clockHours: 'not-applicable' } } } },
      { name: 'CP over three hours', record: { before: { pvr: { grade: 'CP', clockHours: 3 } } } },
    ],
    unknown: [{ name: 'grade not recorded', record: { before: { pvr: { clockHours: 3 } } } }],
  },
});
