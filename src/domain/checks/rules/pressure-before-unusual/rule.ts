import { defineRule } from '../../define-rule.ts';
import { numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'pressure-before-unusual',
  family: 'diagnosis',
  level: 'caution',
  title: 'A high pressure before surgery for detachment',
  why: 'A detached eye is usually soft; high pressure points to glaucoma, angle closure or a slip.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: ({ before }) => {
    const pressure = before?.pressureMmHg;
    return pressure === undefined || pressure < 40
      ? []
      : [
          {
            fields: ['before.pressureMmHg'],
            message: `A pressure of ${numberWords(pressure)} mmHg is recorded before the operation.`,
          },
        ];
  },
  examples: {
    fires: [{ name: '61', fields: 'before.pressureMmHg', record: { before: { pressureMmHg: 61 } } }],
    silent: [{ name: 'soft', record: { before: { pressureMmHg: 6 } } }],
    unknown: [{ name: 'not measured', record: { before: { macula: 'on' } } }],
  },
});
