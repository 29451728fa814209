import { defineRule } from '../../define-rule.ts';
import { numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'paracentesis-not-done-with-volume',
  family: 'tamponade',
  level: 'contradiction',
  title: 'No paracentesis, and a volume let out by it',
  why: 'How the pressure was brought down after an injection is asked when it rises again.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: ({ tamponade }) =>
    tamponade?.paracentesis === false && (tamponade.paracentesisVolumeMl ?? 0) > 0
      ? [
          {
            fields: ['tamponade.paracentesis', 'tamponade.paracentesisVolumeMl'],
            message: `Paracentesis is recorded as not done, and as ${numberWords(tamponade.paracentesisVolumeMl ?? 0)} mL.`,
          },
        ]
      : [],
  examples: {
    fires: [
      {
        name: 'volume without it',
        fields: 'tamponade.paracentesis',
        record: { tamponade: { paracentesis: false, paracentesisVolumeMl: 0.3 } },
      },
    ],
    silent: [{ name: 'done', record: { tamponade: { paracentesis: true, paracentesisVolumeMl: 0.3 } } }],
    unknown: [{ name: 'not recorded', record: { tamponade: { paracentesisVolumeMl: 0.3 } } }],
  },
});
