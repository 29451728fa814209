import { defineRule } from '../../define-rule.ts';
import { ageOf, dateWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'born-after-surgery',
  family: 'time',
  level: 'contradiction',
  title: 'The date of birth cannot be right',
  why: 'A wrong date of birth can mean a wrong patient.',
  source: { text: '42 CFR 482.51(b)(6), tag A-0959: identity', certainty: 'R2' },
  answerable: false,
  check: (record) => {
    const born = record.who?.patient?.dateOfBirth;
    const age = ageOf(record);
    if (born === undefined || age === undefined || (age >= 0 && age <= 115)) return [];
    return [
      {
        fields: ['who.patient.dateOfBirth', 'who.startedAt'],
        message: `Born ${dateWords(born)}, the patient would have been ${age} years old at the operation.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'born later',
        fields: 'who.patient.dateOfBirth',
        record: { who: { patient: { dateOfBirth: '2027-01-01' }, startedAt: '2026-12-01T10:00' } },
      },
    ],
    silent: [
      {
        name: '65 years',
        record: { who: { patient: { dateOfBirth: '1961-03-14' }, startedAt: '2026-12-01T10:00' } },
      },
    ],
    unknown: [{ name: 'no start', record: { who: { patient: { dateOfBirth: '2027-01-01' } } } }],
  },
});
