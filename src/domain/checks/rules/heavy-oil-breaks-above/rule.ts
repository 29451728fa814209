import { hoursApart, showClock } from '../../../anatomy/clock.ts';
import { defineRule } from '../../define-rule.ts';
import { breaksOf, listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'heavy-oil-breaks-above',
  family: 'tamponade',
  level: 'caution',
  title: 'Heavy oil with breaks only in the upper half',
  why: 'Heavy oil sinks and is chosen for breaks below; above it leaves them in fluid.',
  source: { text: 'Heavier than water from about 1.06', certainty: 'M' },
  answerable: true,
  unless: ['posture-leaves-break-dry'],
  check: (record) => {
    const clocks = breaksOf(record).flatMap(({ clock, supportedByElements }) =>
      clock === undefined || Array.isArray(supportedByElements) ? [] : [clock],
    );
    if (
      record.tamponade?.agent !== 'heavy-oil' ||
      clocks.length === 0 ||
      clocks.length < breaksOf(record).length
    )
      return [];
    if (clocks.some((clock) => hoursApart(clock, 12) > 2.5)) return [];
    return [
      {
        fields: ['tamponade.agent', 'breaks.found'],
        message: `Heavy silicone oil is left in the eye; the breaks are at ${listWords(clocks.map(showClock))}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'above',
        fields: 'tamponade.agent',
        record: { breaks: { found: [{ clock: 11 }, { clock: 1 }] }, tamponade: { agent: 'heavy-oil' } },
      },
    ],
    silent: [
      {
        name: 'below',
        record: { breaks: { found: [{ clock: 6 }, { clock: 1 }] }, tamponade: { agent: 'heavy-oil' } },
      },
    ],
    unknown: [
      {
        name: 'hours not recorded',
        record: { breaks: { found: [{ kind: 'horseshoe' }] }, tamponade: { agent: 'heavy-oil' } },
      },
    ],
  },
});
