import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'earlier-surgery-on-other-eye-only',
  family: 'side',
  level: 'contradiction',
  title: 'A recurrence in an eye that had no surgery before',
  why: 'Either the side of the earlier operation or the recurrence is wrong, and with it the modifier.',
  source: { text: 'CPT modifier 78: return for recurrence', certainty: 'R' },
  answerable: false,
  check: (record) => {
    const eye = record.who?.eye;
    const before = record.before?.previousOperations;
    if (record.before?.recurrent !== true || before === undefined) return [];
    if (before === 'none') {
      return [
        {
          fields: ['before.recurrent', 'before.previousOperations'],
          message: 'The detachment is recorded as recurrent, and previous eye operations as none.',
        },
      ];
    }
    if (eye === undefined || before.some((one) => one.eye === undefined || one.eye === eye)) return [];
    return [
      {
        fields: ['before.previousOperations.0.eye', 'before.recurrent', 'who.eye'],
        message: `The detachment of the ${eye} eye is recorded as recurrent; all previous operations are recorded for the ${eye === 'left' ? 'right' : 'left'} eye.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'none before',
        fields: 'before.recurrent',
        record: { before: { recurrent: true, previousOperations: 'none' } },
      },
      {
        name: 'only the fellow eye',
        fields: 'before.previousOperations.0.eye',
        record: {
          who: { eye: 'left' },
          before: { recurrent: true, previousOperations: [{ what: 'vitrectomy', eye: 'right' }] },
        },
      },
    ],
    silent: [
      {
        name: 'both eyes',
        record: {
          who: { eye: 'left' },
          before: {
            recurrent: true,
            previousOperations: [
              { what: 'vitrectomy', eye: 'right' },
              { what: 'laser', eye: 'left' },
            ],
          },
        },
      },
      {
        name: 'first detachment, fellow eye operated on',
        record: {
          who: { eye: 'left' },
          before: { recurrent: false, previousOperations: [{ what: 'vitrectomy', eye: 'right' }] },
        },
      },
    ],
    unknown: [
      { name: 'history not recorded', record: { who: { eye: 'left' }, before: { recurrent: true } } },
      {
        name: 'eye of the earlier operation not recorded',
        record: {
          who: { eye: 'left' },
          before: { recurrent: true, previousOperations: [{ what: 'vitrectomy' }] },
        },
      },
    ],
  },
});
