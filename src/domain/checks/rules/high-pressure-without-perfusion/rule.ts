import { defineRule } from '../../define-rule.ts';
import { elementsOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'high-pressure-without-perfusion',
  family: 'tension',
  level: 'omission',
  title: 'A pressure at which arteries close, and the disc was not said to be perfused',
  why: 'The central retinal artery closed at 48 to 110 mmHg during buckling, exceeded in 13 of 20 eyes.',
  source: { text: 'Gardner, Ophthalmology 1993;100:1050', certainty: 'R' },
  answerable: true,
  unless: ['perfusion-not-recorded'],
  check: (record) => {
    if (record.endOfCase?.discPerfused !== undefined) return [];
    const index = elementsOf(record).findIndex(
      ({ pressureWhileTensioningMmHg: pressure = 0 }) => pressure >= 48,
    );
    if (index >= 0) {
      return [
        {
          fields: ['endOfCase.discPerfused', `buckle.elements.${index}.pressureWhileTensioningMmHg`],
          message: `The pressure was ${numberWords(elementsOf(record)[index]?.pressureWhileTensioningMmHg ?? 0)} mmHg while tensioning; whether the disc was perfused is not recorded.`,
        },
      ];
    }
    const atEnd = record.endOfCase?.pressureMmHg;
    return atEnd !== undefined && atEnd >= 40
      ? [
          {
            fields: ['endOfCase.discPerfused', 'endOfCase.pressureMmHg'],
            message: `The pressure at the end was ${numberWords(atEnd)} mmHg; whether the disc was perfused is not recorded.`,
          },
        ]
      : [];
  },
  examples: {
    fires: [
      {
        name: '60 mmHg while tensioning',
        fields: 'endOfCase.discPerfused',
        record: { buckle: { elements: [{ role: 'encircling', pressureWhileTensioningMmHg: 60 }] } },
      },
      {
        name: '45 mmHg at the end',
        fields: 'endOfCase.discPerfused',
        record: { endOfCase: { pressureMmHg: 45 } },
      },
    ],
    silent: [
      {
        name: 'perfused',
        record: {
          buckle: { elements: [{ role: 'encircling', pressureWhileTensioningMmHg: 60 }] },
          endOfCase: { discPerfused: true },
        },
      },
      { name: '20 mmHg', record: { endOfCase: { pressureMmHg: 20 } } },
    ],
    unknown: [{ name: 'pressure not recorded', record: { buckle: { elements: [{ role: 'encircling' }] } } }],
  },
});
