import { arcOfFill } from '../../../physics/bubble.ts';
import { expansionOf } from '../../../physics/gas.ts';
import { defineRule } from '../../define-rule.ts';
import { breaksOf, gasOf, numberIn, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'bubble-smaller-than-break',
  family: 'tamponade',
  level: 'caution',
  title: 'A bubble too small to span a break',
  why: 'A bubble that touches only a part of a break lets fluid through the rest.',
  source: { text: 'Cap of a sphere: V = πh²(3R−h)/3', certainty: 'C' },
  answerable: true,
  check: (record) => {
    const gas = gasOf(record);
    const fill = record.tamponade?.fillPercent;
    if (gas === undefined || fill === undefined) return [];
    const percent =
      record.tamponade?.mixing === 'pure' ? 100 : (numberIn(record.tamponade?.concentrationPercent) ?? 100);
    const arc = arcOfFill(Math.min(1, (fill / 100) * expansionOf(gas, percent)));
    return breaksOf(record).flatMap(({ extentClockHours, onDetachedRetina, supportedByElements }, index) => {
      const held = Array.isArray(supportedByElements) || onDetachedRetina === false;
      if (extentClockHours === undefined || held || extentClockHours * 30 <= arc + 15) return [];
      return [
        {
          fields: ['tamponade.fillPercent', `breaks.found.${index}.extentClockHours`],
          message: `A fill of ${numberWords(fill)}% touches about ${Math.round(arc)}° of the wall (an estimate); break ${index + 1} extends over ${numberWords(extentClockHours * 30)}°.`,
        },
      ];
    });
  },
  examples: {
    fires: [
      {
        name: 'giant tear and a small bubble',
        fields: 'tamponade.fillPercent',
        record: {
          breaks: { found: [{ kind: 'giant-tear', extentClockHours: 6 }] },
          tamponade: { agent: 'air', fillPercent: 20 },
        },
      },
    ],
    silent: [
      {
        name: 'a full fill',
        record: {
          breaks: { found: [{ kind: 'giant-tear', extentClockHours: 6 }] },
          tamponade: { agent: 'C3F8', concentrationPercent: 14, fillPercent: 95 },
        },
      },
    ],
    unknown: [
      {
        name: 'fill not recorded',
        record: {
          breaks: { found: [{ kind: 'giant-tear', extentClockHours: 6 }] },
          tamponade: { agent: 'air' },
        },
      },
    ],
  },
});
