import { showClock } from '../../../anatomy/clock.ts';
import { defineRule } from '../../define-rule.ts';
import { breaksOf, labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'break-entered-twice',
  family: 'breaks',
  level: 'caution',
  title: 'Two breaks with the same kind, hour and place',
  why: 'The number of breaks decides the code; one may have been entered twice.',
  source: { text: 'ICD-10-CM H33.01 one break, H33.02 several', certainty: 'R' },
  answerable: true,
  check: (record) => {
    const seen = new Map<string, number>();
    return breaksOf(record).flatMap(({ kind, clock, zone, frontEdgeMm, extentClockHours }, index) => {
      if (kind === undefined || clock === undefined || (zone === undefined && frontEdgeMm === undefined))
        return [];
      const key = [kind, clock, zone, frontEdgeMm, extentClockHours].join('|');
      const first = seen.get(key);
      if (first === undefined) {
        seen.set(key, index);
        return [];
      }
      return [
        {
          fields: [`breaks.found.${index}.clock`, `breaks.found.${first}.clock`],
          message: `Breaks ${first + 1} and ${index + 1} are both recorded as ${labelOf('breaks.found.kind', kind)} at ${showClock(clock)}, in the same place.`,
        },
      ];
    });
  },
  examples: {
    fires: [
      {
        name: 'entered twice',
        fields: 'breaks.found.1.clock',
        record: {
          breaks: {
            found: [
              { kind: 'horseshoe', clock: 10, zone: 'equator' },
              { kind: 'horseshoe', clock: 10, zone: 'equator' },
            ],
          },
        },
      },
    ],
    silent: [
      {
        name: 'two at one hour',
        record: {
          breaks: {
            found: [
              { kind: 'round-hole', clock: 10, frontEdgeMm: 9 },
              { kind: 'round-hole', clock: 10, frontEdgeMm: 12 },
            ],
          },
        },
      },
    ],
    unknown: [
      {
        name: 'place not recorded',
        record: {
          breaks: {
            found: [
              { kind: 'horseshoe', clock: 10 },
              { kind: 'horseshoe', clock: 10 },
            ],
          },
        },
      },
    ],
  },
});
