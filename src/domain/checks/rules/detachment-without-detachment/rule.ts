import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'detachment-without-detachment',
  family: 'diagnosis',
  level: 'contradiction',
  title: 'A break without detachment, and an extent of detachment',
  why: 'With and without detachment are different operations and different codes.',
  source: { text: 'ICD-10-CM H33.0 against H33.3', certainty: 'R' },
  answerable: false,
  check: ({ before }) => {
    if (before?.diagnosis !== 'break-without-detachment') return [];
    const extent =
      before.totalDetachment === true ||
      (before.detachmentFromClock !== undefined && before.detachmentToClock !== undefined) ||
      before.macula === 'off';
    return extent
      ? [
          {
            fields: ['before.diagnosis', 'before.detachmentFromClock'],
            message: 'The diagnosis is a retinal break without detachment; detached retina is recorded.',
          },
        ]
      : [];
  },
  examples: {
    fires: [
      {
        name: 'macula off',
        fields: 'before.diagnosis',
        record: { before: { diagnosis: 'break-without-detachment', macula: 'off' } },
      },
    ],
    silent: [
      { name: 'no extent', record: { before: { diagnosis: 'break-without-detachment', macula: 'on' } } },
    ],
    unknown: [{ name: 'diagnosis not recorded', record: { before: { macula: 'off' } } }],
  },
});
