import { arcHours } from '../../../anatomy/clock.ts';
import { defineRule } from '../../define-rule.ts';
import { numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'pvr-d-without-total-detachment',
  family: 'diagnosis',
  level: 'contradiction',
  title: 'PVR of grade D in a detachment that is not total',
  why: 'Grade D means fixed folds in all four quadrants.',
  source: { text: 'Retina Society 1983: D, folds in four quadrants', certainty: 'M' },
  answerable: false,
  unless: ['extent-against-quadrants'],
  check: ({ before }) => {
    const grade = before?.pvr?.grade;
    const { quadrantsDetached: quadrants, detachmentFromClock: from, detachmentToClock: to } = before ?? {};
    if (grade === undefined || !grade.startsWith('D')) return [];
    if (quadrants !== undefined && quadrants < 4) {
      return [
        {
          fields: ['before.pvr.grade', 'before.quadrantsDetached'],
          message: `PVR is graded ${grade}, which is all four quadrants; ${quadrants} ${quadrants === 1 ? 'quadrant is' : 'quadrants are'} recorded as detached.`,
        },
      ];
    }
    const hours = from === undefined || to === undefined ? 12 : arcHours({ from, to });
    return hours >= 9
      ? []
      : [
          {
            fields: ['before.pvr.grade', 'before.detachmentFromClock', 'before.detachmentToClock'],
            message: `PVR is graded ${grade}, which is all four quadrants; the detachment extends over ${numberWords(hours)} clock hours.`,
          },
        ];
  },
  examples: {
    fires: [
      {
        name: 'two quadrants',
        fields: 'before.pvr.grade',
        record: { before: { pvr: { grade: 'D1' }, quadrantsDetached: 2 } },
      },
      {
        name: 'four hours',
        fields: 'before.pvr.grade',
        record: { before: { pvr: { grade: 'D2' }, detachmentFromClock: 10, detachmentToClock: 2 } },
      },
    ],
    silent: [
      { name: 'total', record: { before: { pvr: { grade: 'D2' }, totalDetachment: true } } },
      { name: 'C3 in three quadrants', record: { before: { pvr: { grade: 'C3' }, quadrantsDetached: 3 } } },
    ],
    unknown: [{ name: 'extent not recorded', record: { before: { pvr: { grade: 'D1' } } } }],
  },
});
