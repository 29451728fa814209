import { cavityMl } from '../../../physics/bubble.ts';
import { defineRule } from '../../define-rule.ts';
import { labelOf, numberWords, oilOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'large-fill-volume-mismatch',
  family: 'tamponade',
  level: 'contradiction',
  title: 'More put in than the eye can hold',
  why: 'A cavity of this size takes far less; a decimal point may be wrong.',
  source: { text: 'V = 4/3·πR³ of the cavity', certainty: 'C' },
  answerable: false,
  check: (record) => {
    const volume = record.tamponade?.volumeMl;
    const agent = record.tamponade?.agent;
    const length = record.before?.axialLengthMm;
    if (volume === undefined || agent === undefined || agent === 'none' || length === undefined) return [];
    // Oil and gas flushed through count as put in: twice the cavity is the line.
    const most = cavityMl(length / 2) * 2;
    if (oilOf(record) === undefined || volume <= most) return [];
    return [
      {
        fields: ['tamponade.volumeMl', 'before.axialLengthMm'],
        message: `${numberWords(volume)} mL of ${labelOf('tamponade.agent', agent)} is recorded; an eye of ${numberWords(length)} mm holds about ${numberWords(Math.round(cavityMl(length / 2)))} mL (an estimate).`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: '18 mL',
        fields: 'tamponade.volumeMl',
        record: { before: { axialLengthMm: 24 }, tamponade: { agent: 'silicone-oil', volumeMl: 18 } },
      },
    ],
    silent: [
      {
        name: '5 mL',
        record: { before: { axialLengthMm: 24 }, tamponade: { agent: 'silicone-oil', volumeMl: 5 } },
      },
    ],
    unknown: [
      { name: 'axial length not measured', record: { tamponade: { agent: 'silicone-oil', volumeMl: 18 } } },
    ],
  },
});
