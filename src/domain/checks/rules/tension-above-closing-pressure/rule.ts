import { defineRule } from '../../define-rule.ts';
import { elementsOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'tension-above-closing-pressure',
  family: 'tension',
  level: 'caution',
  title: 'A pressure while tensioning at which arteries have closed',
  why: 'The central retinal artery closed at 48 to 110 mmHg, on average at 79.',
  source: { text: 'Gardner, Ophthalmology 1993;100:1050', certainty: 'R' },
  answerable: true,
  check: (record) =>
    elementsOf(record).flatMap(({ pressureWhileTensioningMmHg: pressure }, index) =>
      pressure === undefined || pressure <= 79
        ? []
        : [
            {
              fields: [`buckle.elements.${index}.pressureWhileTensioningMmHg`],
              message: `The pressure while tensioning was ${numberWords(pressure)} mmHg.`,
            },
          ],
    ),
  examples: {
    fires: [
      {
        name: '120 mmHg',
        fields: 'buckle.elements.0.pressureWhileTensioningMmHg',
        record: { buckle: { elements: [{ pressureWhileTensioningMmHg: 120 }] } },
      },
    ],
    silent: [{ name: '60 mmHg', record: { buckle: { elements: [{ pressureWhileTensioningMmHg: 60 }] } } }],
    unknown: [{ name: 'not recorded', record: { buckle: { elements: [{ role: 'encircling' }] } } }],
  },
});
