import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'thrombosis-prophylaxis-missing',
  family: 'standards',
  level: 'omission',
  title: 'General anaesthesia without a word on thrombosis prophylaxis',
  why: 'That it was assessed belongs in the note, also where none was needed.',
  source: {
    text: 'Royal College of Surgeons of England, Good Surgical Practice 2014: DVT prophylaxis',
    certainty: 'R2',
  },
  answerable: true,
  check: ({ anaesthesia, endOfCase }) =>
    anaesthesia?.kind === 'general' &&
    endOfCase !== undefined &&
    endOfCase.thrombosisProphylaxis === undefined
      ? [
          {
            fields: ['endOfCase.thrombosisProphylaxis'],
            message:
              'Anaesthesia was general; thrombosis prophylaxis, or that none was needed, is not recorded.',
          },
        ]
      : [],
  examples: {
    fires: [
      {
        name: 'not said',
        fields: 'endOfCase.thrombosisProphylaxis',
        record: { anaesthesia: { kind: 'general' }, endOfCase: { retina: 'flat' } },
      },
    ],
    silent: [
      {
        name: 'none needed',
        record: { anaesthesia: { kind: 'general' }, endOfCase: { thrombosisProphylaxis: 'not-indicated' } },
      },
      { name: 'block', record: { anaesthesia: { kind: 'sub-tenon' }, endOfCase: { retina: 'flat' } } },
    ],
    unknown: [{ name: 'end not begun', record: { anaesthesia: { kind: 'general' } } }],
  },
});
