import { defineRule } from '../../define-rule.ts';
import { complicationsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'complication-without-kind',
  family: 'standards',
  level: 'omission',
  title: 'A complication without what it was',
  why: 'What was done about something unnamed tells nobody anything.',
  source: { text: 'C-CDA Operative Note: complications 55109-3', certainty: 'R' },
  answerable: true,
  check: (record) =>
    complicationsOf(record).flatMap(({ kind, detail, action }, index) => {
      if (
        (kind !== undefined && kind !== 'other') ||
        detail !== undefined ||
        (kind === undefined && action === undefined)
      )
        return [];
      return [
        {
          fields: [
            kind === undefined
              ? `endOfCase.complications.${index}.kind`
              : `endOfCase.complications.${index}.detail`,
          ],
          message:
            kind === undefined
              ? `What was done about a complication is recorded (${action ?? ''}); what it was is not.`
              : 'A complication is recorded as other; what it was is not.',
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'other',
        fields: 'endOfCase.complications.0.detail',
        record: { endOfCase: { complications: [{ kind: 'other', action: 'observed' }] } },
      },
      {
        name: 'only what was done',
        fields: 'endOfCase.complications.0.kind',
        record: { endOfCase: { complications: [{ action: 'observed' }] } },
      },
    ],
    silent: [
      { name: 'none', record: { endOfCase: { complications: 'none' } } },
      { name: 'named', record: { endOfCase: { complications: [{ kind: 'corneal-oedema' }] } } },
    ],
    unknown: [{ name: 'complications not recorded', record: { endOfCase: { retina: 'flat' } } }],
  },
});
