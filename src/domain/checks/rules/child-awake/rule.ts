import { defineRule } from '../../define-rule.ts';
import { ageOf, labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'child-awake',
  family: 'medicines',
  level: 'caution',
  title: 'A child operated on awake',
  why: 'Date of birth or anaesthesia may be a slip.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: (record) => {
    const age = ageOf(record);
    const kind = record.anaesthesia?.kind;
    if (age === undefined || age < 0 || age >= 13 || kind === undefined || kind === 'general') return [];
    return [
      {
        fields: ['anaesthesia.kind', 'who.patient.dateOfBirth'],
        message: `A patient of ${age} years was operated on under ${labelOf('anaesthesia.kind', kind)}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'nine years',
        fields: 'anaesthesia.kind',
        record: {
          who: { patient: { dateOfBirth: '2017-01-05' }, startedAt: '2026-03-02T09:00' },
          anaesthesia: { kind: 'sub-tenon' },
        },
      },
    ],
    silent: [
      {
        name: 'general',
        record: {
          who: { patient: { dateOfBirth: '2017-01-05' }, startedAt: '2026-03-02T09:00' },
          anaesthesia: { kind: 'general' },
        },
      },
    ],
    unknown: [
      {
        name: 'date of birth not recorded',
        record: { who: { startedAt: '2026-03-02T09:00' }, anaesthesia: { kind: 'sub-tenon' } },
      },
    ],
  },
});
