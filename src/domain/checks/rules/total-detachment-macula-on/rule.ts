import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'total-detachment-macula-on',
  family: 'diagnosis',
  level: 'contradiction',
  title: 'A total detachment with the macula on',
  why: 'The state of the macula decides urgency and prognosis.',
  source: { text: 'Macula: on, off, split', certainty: 'R' },
  answerable: false,
  check: ({ before }) =>
    before?.totalDetachment === true && before.macula === 'on'
      ? [
          {
            fields: ['before.macula', 'before.totalDetachment'],
            message: 'The retina is recorded as totally detached and the macula as on.',
          },
        ]
      : [],
  examples: {
    fires: [
      {
        name: 'total, macula on',
        fields: 'before.macula',
        record: { before: { totalDetachment: true, macula: 'on' } },
      },
    ],
    silent: [{ name: 'total, macula off', record: { before: { totalDetachment: true, macula: 'off' } } }],
    unknown: [{ name: 'macula not recorded', record: { before: { totalDetachment: true } } }],
  },
});
