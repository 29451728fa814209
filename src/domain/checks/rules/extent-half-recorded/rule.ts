import { showClock } from '../../../anatomy/clock.ts';
import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'extent-half-recorded',
  family: 'diagnosis',
  level: 'omission',
  title: 'One border of the detachment without the other',
  why: 'An extent needs both ends; where to look for the break follows from them.',
  source: { text: 'RC.02.01.03: each finding', certainty: 'R' },
  answerable: true,
  check: ({ before }) => {
    const { detachmentFromClock: from, detachmentToClock: to, totalDetachment } = before ?? {};
    if (totalDetachment === true || (from === undefined) === (to === undefined)) return [];
    const said =
      from === undefined ? `to ${showClock(to ?? 12)}; from where` : `from ${showClock(from)}; to where`;
    return [
      {
        fields: [from === undefined ? 'before.detachmentFromClock' : 'before.detachmentToClock'],
        message: `The detachment is recorded ${said} is not.`,
      },
    ];
  },
  examples: {
    fires: [
      { name: 'no end', fields: 'before.detachmentToClock', record: { before: { detachmentFromClock: 10 } } },
      {
        name: 'no beginning',
        fields: 'before.detachmentFromClock',
        record: { before: { detachmentToClock: 2 } },
      },
    ],
    silent: [
      { name: 'both', record: { before: { detachmentFromClock: 10, detachmentToClock: 2 } } },
      { name: 'total', record: { before: { detachmentFromClock: 12, totalDetachment: true } } },
    ],
    unknown: [{ name: 'extent not recorded', record: { before: { macula: 'on' } } }],
  },
});
