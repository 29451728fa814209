import { mayLieIn, quadrantAt, showClock } from '../../../anatomy/clock.ts';
import { defineRule } from '../../define-rule.ts';
import { breaksOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'clock-outside-quadrant',
  family: 'breaks',
  level: 'contradiction',
  title: 'A break’s clock hour does not lie in its quadrant',
  why: 'One of the two is wrong, and the next surgeon will look in the wrong place.',
  source: { text: 'Temporal is 9 o’clock in a right eye and 3 o’clock in a left', certainty: 'P' },
  answerable: false,
  check: (record) => {
    const eye = record.who?.eye;
    if (eye === undefined) return [];
    return breaksOf(record).flatMap(({ clock, quadrant }, index) => {
      if (clock === undefined || quadrant === undefined) return [];
      if (mayLieIn(quadrant, clock, 0.5, eye)) return [];
      const message = `Break ${index + 1} lies at ${showClock(clock)}, which is ${quadrantAt(clock, eye)} in the ${eye} eye, and is recorded as ${quadrant}.`;
      return [
        { fields: [`breaks.found.${index}.quadrant`, `breaks.found.${index}.clock`, 'who.eye'], message },
      ];
    });
  },
  examples: {
    fires: [
      {
        name: 'mirrored in the left eye',
        fields: 'breaks.found.0.quadrant',
        record: { who: { eye: 'left' }, breaks: { found: [{ clock: 2, quadrant: 'superonasal' }] } },
      },
      {
        name: 'upside down',
        fields: 'breaks.found.0.quadrant',
        record: { who: { eye: 'right' }, breaks: { found: [{ clock: 11, quadrant: 'inferotemporal' }] } },
      },
    ],
    silent: [
      {
        name: 'left eye',
        record: { who: { eye: 'left' }, breaks: { found: [{ clock: 2, quadrant: 'superotemporal' }] } },
      },
      {
        name: 'on the border',
        record: { who: { eye: 'left' }, breaks: { found: [{ clock: 12, quadrant: 'superonasal' }] } },
      },
    ],
    unknown: [
      { name: 'eye not recorded', record: { breaks: { found: [{ clock: 2, quadrant: 'superonasal' }] } } },
    ],
  },
});
