import { arcHours, showClock } from '../../../anatomy/clock.ts';
import { defineRule } from '../../define-rule.ts';
import { numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'total-against-arc',
  family: 'diagnosis',
  level: 'contradiction',
  title: 'A total detachment with two borders',
  why: 'A total detachment has no attached retina to border on; extent decides on the code.',
  source: { text: 'ICD-10-CM H33.05: total detachment', certainty: 'R' },
  answerable: false,
  check: ({ before }) => {
    const { totalDetachment, detachmentFromClock: from, detachmentToClock: to } = before ?? {};
    if (totalDetachment !== true || from === undefined || to === undefined) return [];
    const hours = arcHours({ from, to });
    if (hours >= 11) return [];
    return [
      {
        fields: ['before.totalDetachment', 'before.detachmentFromClock', 'before.detachmentToClock'],
        message: `The detachment is recorded as total, and as extending over ${numberWords(hours)} clock hours, from ${showClock(from)} to ${showClock(to)}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'total from 9 to 2',
        fields: 'before.totalDetachment',
        record: { before: { totalDetachment: true, detachmentFromClock: 9, detachmentToClock: 2 } },
      },
    ],
    silent: [
      {
        name: 'all round',
        record: { before: { totalDetachment: true, detachmentFromClock: 12, detachmentToClock: 12 } },
      },
      {
        name: 'not total',
        record: { before: { totalDetachment: false, detachmentFromClock: 9, detachmentToClock: 2 } },
      },
    ],
    unknown: [{ name: 'one border', record: { before: { totalDetachment: true, detachmentFromClock: 9 } } }],
  },
});
