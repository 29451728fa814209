import { defineRule } from '../../define-rule.ts';
import { listWords, missingFrom } from '../../facts.ts';

export const rule = defineRule({
  id: 'required-who',
  family: 'standards',
  level: 'omission',
  title: 'Assistants, times, urgency, sides and allergies are not complete',
  why: 'An auditor looks for each of them, and an empty field proves nothing.',
  source: {
    text: '42 CFR 482.51(b)(6), tag A-0959; Royal College of Surgeons of England, Good Surgical Practice 2014',
    certainty: 'R2',
  },
  answerable: true,
  check: ({ who }) => {
    const missing = missingFrom([
      { field: 'who.patient.allergies', what: 'allergies or none', value: who?.patient?.allergies },
      { field: 'who.consentEye', what: 'the side on the consent', value: who?.consentEye },
      { field: 'who.timeOutEye', what: 'the side at the time-out', value: who?.timeOutEye },
      { field: 'who.urgency', what: 'the urgency', value: who?.urgency },
      { field: 'who.endedAt', what: 'the end', value: who?.endedAt },
      { field: 'who.assistants', what: 'assistants or none', value: who?.assistants },
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
    fires: [{ name: 'nothing', fields: 'who.patient.allergies', record: {} }],
    silent: [
      {
        name: 'complete',
        record: {
          who: {
            patient: { allergies: 'none' },
            consentEye: 'left',
            timeOutEye: 'left',
            urgency: 'urgent',
            endedAt: '2026-03-02T10:10',
            assistants: 'none',
          },
        },
      },
    ],
    unknown: [],
  },
});
