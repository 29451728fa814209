import { defineRule } from '../../define-rule.ts';
import { listWords, missingFrom } from '../../facts.ts';

export const rule = defineRule({
  id: 'required-identity',
  family: 'standards',
  level: 'omission',
  title: 'Who was operated on, which eye, what, when and by whom',
  why: 'These identify the operation; a note without them proves nothing.',
  source: { text: '42 CFR 482.51(b)(6), tag A-0959; RC.02.01.03', certainty: 'R2' },
  answerable: false,
  check: ({ who }) => {
    const missing = missingFrom([
      { field: 'who.patient.familyName', what: 'the patient’s name', value: who?.patient?.familyName },
      { field: 'who.patient.number', what: 'the record number', value: who?.patient?.number },
      { field: 'who.patient.dateOfBirth', what: 'the date of birth', value: who?.patient?.dateOfBirth },
      { field: 'who.eye', what: 'the eye', value: who?.eye },
      { field: 'who.performed', what: 'the procedures performed', value: who?.performed },
      { field: 'who.startedAt', what: 'the start', value: who?.startedAt },
      { field: 'who.surgeon.name', what: 'the surgeon', value: who?.surgeon?.name },
    ]);
    if (missing.length === 0) return [];
    return [
      {
        fields: missing.map(({ field }) => field),
        message: `Not recorded: ${listWords(missing.map(({ what }) => what))}.`,
      },
    ];
  },
  examples: {
    fires: [
      { name: 'nothing', fields: 'who.patient.familyName', record: {} },
      {
        name: 'no eye',
        fields: 'who.eye',
        record: {
          who: {
            patient: { familyName: 'Hallowby', number: 'DEMO-1', dateOfBirth: '1960-02-03' },
            performed: ['vitrectomy'],
            startedAt: '2026-03-02T09:00',
            surgeon: { name: 'A. Fenwarden' },
          },
        },
      },
    ],
    silent: [
      {
        name: 'complete',
        record: {
          who: {
            patient: { familyName: 'Hallowby', number: 'DEMO-1', dateOfBirth: '1960-02-03' },
            eye: 'left',
            performed: ['vitrectomy'],
            startedAt: '2026-03-02T09:00',
            surgeon: { name: 'A. Fenwarden' },
          },
        },
      },
    ],
    unknown: [],
  },
});
