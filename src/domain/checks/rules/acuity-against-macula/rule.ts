import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'acuity-against-macula',
  family: 'diagnosis',
  level: 'caution',
  title: 'Good sight with the macula off',
  why: 'An eye that reads well has its fovea attached; the state of the macula decides urgency and prognosis.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: ({ before }) => {
    const acuity = before?.acuity;
    const snellen = /(?<![\d/])(6|20)\s*\/\s*(\d+(?:\.\d+)?)/.exec(acuity ?? '');
    if (before?.macula !== 'off' || acuity === undefined || snellen === null) return [];
    if (Number(snellen[1]) / Number(snellen[2]) < 0.66) return [];
    return [
      {
        fields: ['before.macula', 'before.acuity'],
        message: `The macula is recorded as off, with a visual acuity of ${acuity}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: '6/6 with the macula off',
        fields: 'before.macula',
        record: { before: { macula: 'off', acuity: '6/6' } },
      },
    ],
    silent: [
      { name: '6/60', record: { before: { macula: 'off', acuity: '6/60' } } },
      { name: 'hand movements', record: { before: { macula: 'off', acuity: 'hand movements' } } },
      { name: 'macula on', record: { before: { macula: 'on', acuity: '6/6' } } },
    ],
    unknown: [{ name: 'acuity not recorded', record: { before: { macula: 'off' } } }],
  },
});
