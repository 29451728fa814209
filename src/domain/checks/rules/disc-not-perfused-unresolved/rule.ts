import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'disc-not-perfused-unresolved',
  family: 'tension',
  level: 'contradiction',
  title: 'The disc was not perfused, and there was no complication',
  why: 'An artery that stays closed blinds the eye within an hour or two.',
  source: { text: 'Gardner, Ophthalmology 1993;100:1050', certainty: 'R' },
  answerable: false,
  check: ({ endOfCase }) =>
    endOfCase?.discPerfused === false && endOfCase.complications === 'none'
      ? [
          {
            fields: ['endOfCase.discPerfused', 'endOfCase.complications'],
            message: 'The disc is recorded as not perfused at the end, and complications as none.',
          },
        ]
      : [],
  examples: {
    fires: [
      {
        name: 'not perfused',
        fields: 'endOfCase.discPerfused',
        record: { endOfCase: { discPerfused: false, complications: 'none' } },
      },
    ],
    silent: [
      {
        name: 'recorded as a complication',
        record: {
          endOfCase: {
            discPerfused: false,
            complications: [{ kind: 'arterial-occlusion', action: 'paracentesis' }],
          },
        },
      },
    ],
    unknown: [{ name: 'complications not recorded', record: { endOfCase: { discPerfused: false } } }],
  },
});
