import { defineRule } from '../../define-rule.ts';
import { numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'pressure-at-end',
  family: 'tension',
  level: 'caution',
  title: 'High or low pressure at the end',
  why: 'An artery under high pressure closes; a soft eye bleeds or leaks.',
  source: {
    text: 'The central retinal artery closed at 48–110 mmHg: Gardner, Ophthalmology 1993;100:1050',
    certainty: 'R',
  },
  answerable: true,
  check: ({ endOfCase }) => {
    const pressure = endOfCase?.pressureMmHg;
    if (pressure === undefined || (pressure >= 5 && pressure <= 35)) return [];
    return [
      {
        fields: ['endOfCase.pressureMmHg'],
        message: `The pressure at the end was ${numberWords(pressure)} mmHg.`,
      },
    ];
  },
  examples: {
    fires: [
      { name: '50 mmHg', fields: 'endOfCase.pressureMmHg', record: { endOfCase: { pressureMmHg: 50 } } },
    ],
    silent: [{ name: '18 mmHg', record: { endOfCase: { pressureMmHg: 18 } } }],
    unknown: [{ name: 'not recorded', record: { endOfCase: {} } }],
  },
});
