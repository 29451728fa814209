import { defineRule } from '../../define-rule.ts';
import { breaksOf, labelOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'dialysis-off-the-ora',
  family: 'breaks',
  level: 'contradiction',
  title: 'A dialysis that does not lie at the ora',
  why: 'A dialysis is a disinsertion at the ora; further back it is a tear, which is treated otherwise.',
  source: { text: 'Anatomy; ora 5 to 8.5 mm behind the limbus', certainty: 'P' },
  answerable: false,
  unless: ['break-off-its-zone'],
  check: (record) =>
    breaksOf(record).flatMap(({ kind, zone, frontEdgeMm }, index) => {
      if (kind !== 'dialysis') return [];
      if (zone === 'equator' || zone === 'post-equatorial' || zone === 'posterior-pole') {
        return [
          {
            fields: [`breaks.found.${index}.zone`, `breaks.found.${index}.kind`],
            message: `Break ${index + 1} is recorded as a dialysis, ${labelOf('breaks.found.zone', zone)}.`,
          },
        ];
      }
      return frontEdgeMm !== undefined && frontEdgeMm > 11
        ? [
            {
              fields: [`breaks.found.${index}.frontEdgeMm`, `breaks.found.${index}.kind`],
              message: `Break ${index + 1} is recorded as a dialysis, with its front edge ${numberWords(frontEdgeMm)} mm behind the limbus.`,
            },
          ]
        : [];
    }),
  examples: {
    fires: [
      {
        name: 'behind the equator',
        fields: 'breaks.found.0.zone',
        record: { breaks: { found: [{ kind: 'dialysis', zone: 'post-equatorial' }] } },
      },
      {
        name: 'by the caliper',
        fields: 'breaks.found.0.frontEdgeMm',
        record: { breaks: { found: [{ kind: 'dialysis', frontEdgeMm: 14 }] } },
      },
    ],
    silent: [
      {
        name: 'at the ora',
        record: { breaks: { found: [{ kind: 'dialysis', zone: 'ora', frontEdgeMm: 7 }] } },
      },
    ],
    unknown: [{ name: 'place not recorded', record: { breaks: { found: [{ kind: 'dialysis' }] } } }],
  },
});
