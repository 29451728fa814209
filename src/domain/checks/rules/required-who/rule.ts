import { defineRule } from '../../define-rule.ts';
import { listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'required-who',
  family: 'standards',
  level: 'omission',
  title: 'Who, which eye, what and when are not complete',
  why: 'These identify the operation; a note without them proves nothing.',
  source: { text: '42 CFR 482.51(b)(6), tag A-0959; RC.02.01.03', certainty: 'R2' },
  answerable: true,
  check: ({ who }) => {
    const items = [
      { field: 'who.patient.familyName', what: 'the patient’s name', value: who?.patient?.familyName },
      { field: 'who.patient.number', what: 'the record number', value: who?.patient?.number },
      { field: 'who.patient.dateOfBirth', what: 'the date of birth', value: who?.patient?.dateOfBirth },
      { field: 'who.patient.allergies', what: 'allergies or none', value: who?.patient?.allergies },
      { field: 'who.eye', what: 'the eye', value: who?.eye },
      { field: 'who.performed', what: 'the procedures performed', value: who?.performed },
      { field: 'who.startedAt', what: 'the start', value: who?.startedAt },
      { field: 'who.endedAt', what: 'the end', value: who?.endedAt },
      { field: 'who.urgency', what: 'the urgency', value: who?.urgency },
      { field: 'who.surgeon.name', what: 'the surgeon', value: who?.surgeon?.name },
      { field: 'who.assistants', what: 'assistants or none', value: who?.assistants },
      { field: 'who.timeOutEye', what: 'the side at the time-out', value: who?.timeOutEye },
      { field: 'who.consentEye', what: 'the side on the consent', value: who?.consentEye },
    ].filter(({ value }) => value === undefined);
    if (items.length === 0) return [];
    return [
      {
        fields: items.map(({ field }) => field),
        message: `Not recorded: ${listWords(items.map(({ what }) => what))}.`,
      },
    ];
  },
  examples: {
    fires: [{ name: 'nothing', fields: 'who.patient.familyName', record: {} }],
    silent: [
      {
        name: 'complete',
        record: {
          who: {
            patient: {
              familyName: 'Oakhollow',
              number: 'DEMO-1',
              dateOfBirth: '1961-03-14',
              allergies: 'none',
            },
            eye: 'left',
            consentEye: 'left',
            timeOutEye: 'left',
            performed: ['vitrectomy'],
            startedAt: '2026-12-01T10:00',
            endedAt: '2026-12-01T11:00',
            urgency: 'urgent',
            surgeon: { name: 'A. Surgeon' },
            assistants: 'none',
          },
        },
      },
    ],
    unknown: [],
  },
});
