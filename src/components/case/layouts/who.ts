import { type Layout, one } from './row.ts';

export const whoLayouts: Readonly<Record<string, Layout>> = {
  who: {
    usual: [
      { label: 'Eye', fields: ['eye'] },
      { label: 'On the consent', fields: ['consentEye'] },
      { label: 'Marked', fields: ['markedEye'] },
      { label: 'At time-out', fields: ['timeOutEye', 'timeOutAt'], between: ['', 'at'] },
      ...one('urgency'),
      { fields: ['performed'], sameAs: { path: 'who.planned', words: 'as planned' } },
      { label: 'Operation', fields: ['startedAt', 'endedAt'], between: ['', 'to'] },
      { label: 'Surgeon', fields: ['surgeon.name', 'surgeon.role'], between: ['', 'as'] },
      ...one('supervisor', 'assistants', 'anaesthetist'),
      { label: 'Allergies', fields: ['patient.allergies'] },
    ],
    more: [
      { label: 'Patient', fields: ['patient.familyName', 'patient.givenName'], between: ['', ''] },
      { label: 'Born', fields: ['patient.dateOfBirth', 'patient.number'], between: ['', 'number'] },
      ...one('planned', 'whyChanged', 'theatre', 'scrubNurse'),
      {
        label: 'Referred by',
        fields: ['referrer.name', 'referrer.kind', 'referrer.referredOn'],
        between: ['', '', 'on'],
      },
      ...one('familyDoctor'),
    ],
  },
  'who.supervisor': {
    usual: [{ label: 'Supervisor', fields: ['name', 'scrubbed'], between: ['', 'scrubbed'] }],
  },
  'who.patient.allergies': { usual: [{ fields: ['substance', 'reaction'], between: ['', ''] }] },
  'who.assistants': { usual: [{ fields: ['name', 'role', 'did'], between: ['', 'as', 'did'] }] },
};
