import { arcHours, showClock } from '../../../anatomy/clock.ts';
import { defineRule } from '../../define-rule.ts';
import { numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'extent-against-quadrants',
  family: 'diagnosis',
  level: 'contradiction',
  title: 'Extent of the detachment in clock hours and in quadrants do not agree',
  why: 'Extent decides on the prognosis and on what the auditor counts.',
  source: { text: 'A quadrant is three clock hours', certainty: 'C' },
  answerable: false,
  check: ({ before }) => {
    const {
      detachmentFromClock: from,
      detachmentToClock: to,
      quadrantsDetached: quadrants,
      totalDetachment,
    } = before ?? {};
    if (totalDetachment === true && quadrants !== undefined && quadrants < 4) {
      return [
        {
          fields: ['before.quadrantsDetached', 'before.totalDetachment'],
          message: `The detachment is recorded as total and as ${quadrants} of 4 quadrants.`,
        },
      ];
    }
    if (from === undefined || to === undefined || quadrants === undefined) return [];
    const hours = arcHours({ from, to });
    const most = Math.min(4, Math.floor((hours + 0.5) / 3) + 2);
    if (quadrants <= most && quadrants * 3 >= hours - 0.5) return [];
    const message = `The detachment extends over ${numberWords(hours)} clock hours, from ${showClock(from)} to ${showClock(to)}, and is recorded as ${quadrants} quadrants.`;
    return [
      {
        fields: ['before.quadrantsDetached', 'before.detachmentFromClock', 'before.detachmentToClock'],
        message,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'eight hours in one quadrant',
        fields: 'before.quadrantsDetached',
        record: { before: { detachmentFromClock: 12, detachmentToClock: 8, quadrantsDetached: 1 } },
      },
    ],
    silent: [
      {
        name: 'four hours over two quadrants',
        record: { before: { detachmentFromClock: 1, detachmentToClock: 5, quadrantsDetached: 2 } },
      },
    ],
    unknown: [
      { name: 'no quadrants', record: { before: { detachmentFromClock: 12, detachmentToClock: 8 } } },
    ],
  },
});
