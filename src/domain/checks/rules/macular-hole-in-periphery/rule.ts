import { defineRule } from '../../define-rule.ts';
import { breaksOf, labelOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'macular-hole-in-periphery',
  family: 'breaks',
  level: 'contradiction',
  title: 'A macular hole outside the posterior pole',
  why: 'Kind or place is wrong; a macular hole is treated otherwise.',
  source: { text: 'Anatomy', certainty: 'P' },
  answerable: false,
  check: (record) =>
    breaksOf(record).flatMap(({ kind, zone, frontEdgeMm }, index) => {
      if (kind !== 'macular-hole') return [];
      if (zone !== undefined && zone !== 'posterior-pole') {
        return [
          {
            fields: [`breaks.found.${index}.zone`, `breaks.found.${index}.kind`],
            message: `Break ${index + 1} is recorded as a macular hole, ${labelOf('breaks.found.zone', zone)}.`,
          },
        ];
      }
      return frontEdgeMm !== undefined && frontEdgeMm < 20
        ? [
            {
              fields: [`breaks.found.${index}.frontEdgeMm`, `breaks.found.${index}.kind`],
              message: `Break ${index + 1} is recorded as a macular hole, ${numberWords(frontEdgeMm)} mm behind the limbus.`,
            },
          ]
        : [];
    }),
  examples: {
    fires: [
      {
        name: 'at the equator',
        fields: 'breaks.found.0.zone',
        record: { breaks: { found: [{ kind: 'macular-hole', zone: 'equator' }] } },
      },
      {
        name: 'by the caliper',
        fields: 'breaks.found.0.frontEdgeMm',
        record: { breaks: { found: [{ kind: 'macular-hole', frontEdgeMm: 11 }] } },
      },
    ],
    silent: [
      {
        name: 'posterior pole',
        record: { breaks: { found: [{ kind: 'macular-hole', zone: 'posterior-pole' }] } },
      },
    ],
    unknown: [{ name: 'place not recorded', record: { breaks: { found: [{ kind: 'macular-hole' }] } } }],
  },
});
