import { defineRule } from '../../define-rule.ts';
import { complicationsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'disc-not-perfused-at-end',
  family: 'tension',
  level: 'omission',
  title: 'The disc was not perfused at the end, and it is not among the complications',
  why: 'An artery that stays closed blinds the eye within an hour or two; what was done belongs in the note.',
  source: { text: 'Gardner, Ophthalmology 1993;100:1050', certainty: 'R' },
  answerable: true,
  unless: ['disc-not-perfused-unresolved'],
  check: (record) => {
    if (record.endOfCase?.discPerfused !== false) return [];
    const said = complicationsOf(record).some(
      ({ kind }) => kind === 'arterial-occlusion' || kind === 'high-pressure' || kind === 'other',
    );
    return said
      ? []
      : [
          {
            fields: ['endOfCase.complications', 'endOfCase.discPerfused'],
            message:
              'The disc is recorded as not perfused at the end; it is not among the complications, nor what was done.',
          },
        ];
  },
  examples: {
    fires: [
      {
        name: 'not among them',
        fields: 'endOfCase.complications',
        record: { endOfCase: { discPerfused: false, complications: [{ kind: 'corneal-oedema' }] } },
      },
    ],
    silent: [
      {
        name: 'said',
        record: {
          endOfCase: {
            discPerfused: false,
            complications: [{ kind: 'arterial-occlusion', action: 'paracentesis' }],
          },
        },
      },
    ],
    unknown: [
      { name: 'disc not recorded', record: { endOfCase: { complications: [{ kind: 'corneal-oedema' }] } } },
    ],
  },
});
