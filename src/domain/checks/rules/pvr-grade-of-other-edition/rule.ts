import { defineRule } from '../../define-rule.ts';
import { numberIn } from '../../facts.ts';

export const rule = defineRule({
  id: 'pvr-grade-of-other-edition',
  family: 'diagnosis',
  level: 'contradiction',
  title: 'The PVR grade does not exist in the named classification',
  why: 'C1 of 1983 and CP 1 of 1991 do not mean the same.',
  source: {
    text: 'Retina Society 1983: A, B, C1–3, D; 1991: A, B, CP or CA with clock hours, no D',
    certainty: 'R',
  },
  answerable: false,
  check: ({ before }) => {
    const { edition, grade, clockHours } = before?.pvr ?? {};
    if (edition === undefined || grade === undefined) return [];
    const of1983 = ['C1', 'C2', 'C3', 'D1', 'D2', 'D3'].includes(grade);
    const of1991 = grade === 'CP' || grade === 'CA';
    if ((edition === '1991' && of1983) || (edition === '1983' && of1991)) {
      return [
        {
          fields: ['before.pvr.grade', 'before.pvr.edition'],
          message: `PVR is graded ${grade}, which the ${edition} classification does not have.`,
        },
      ];
    }
    const hours = numberIn(clockHours);
    if (of1991 && hours !== undefined && hours < 1) {
      return [
        {
          fields: ['before.pvr.clockHours'],
          message: `PVR is graded ${grade} with ${hours} clock hours; it has 1 to 12.`,
        },
      ];
    }
    return [];
  },
  examples: {
    fires: [
      {
        name: 'D2 in 1991',
        fields: 'before.pvr.grade',
        record: { before: { pvr: { edition: '1991', grade: 'D2' } } },
      },
    ],
    silent: [
      { name: 'CP in 1991', record: { before: { pvr: { edition: '1991', grade: 'CP', clockHours: 4 } } } },
    ],
    unknown: [{ name: 'no edition', record: { before: { pvr: { grade: 'D2' } } } }],
  },
});
