import { globeOf, poleMm } from '../../../anatomy/globe.ts';
import { defineRule } from '../../define-rule.ts';
import { breaksOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'break-off-the-retina',
  family: 'breaks',
  level: 'contradiction',
  title: 'A break in front of the ora or behind the back of the eye',
  why: 'A decimal point or the wrong reference is the usual cause.',
  source: {
    text: 'Ora from 5 mm behind the limbus; half the circumference from limbus to pole',
    certainty: 'C',
  },
  answerable: false,
  check: (record) => {
    const length = record.before?.axialLengthMm;
    const most = poleMm(globeOf(Math.max(length ?? 36, 20))) + 1;
    return breaksOf(record).flatMap(({ frontEdgeMm, backEdgeMm }, index) => {
      const beyond = [
        { field: 'frontEdgeMm', mm: frontEdgeMm, edge: 'front' },
        { field: 'backEdgeMm', mm: backEdgeMm, edge: 'back' },
      ].find(({ mm }) => mm !== undefined && (mm < 4 || mm > most));
      if (beyond === undefined) return [];
      return [
        {
          fields: [`breaks.found.${index}.${beyond.field}`],
          message: `The ${beyond.edge} edge of break ${index + 1} is recorded ${numberWords(beyond.mm ?? 0)} mm behind the limbus, where there is no retina.`,
        },
      ];
    });
  },
  examples: {
    fires: [
      {
        name: 'in front of the ora',
        fields: 'breaks.found.0.frontEdgeMm',
        record: { breaks: { found: [{ frontEdgeMm: 1.2 }] } },
      },
      {
        name: 'beyond the pole',
        fields: 'breaks.found.0.backEdgeMm',
        record: { before: { axialLengthMm: 24 }, breaks: { found: [{ frontEdgeMm: 11, backEdgeMm: 36 }] } },
      },
    ],
    silent: [
      { name: 'at the ora', record: { breaks: { found: [{ frontEdgeMm: 6, backEdgeMm: 8 }] } } },
      {
        name: 'at the posterior pole of a long eye',
        record: { before: { axialLengthMm: 31 }, breaks: { found: [{ frontEdgeMm: 36 }] } },
      },
    ],
    unknown: [{ name: 'edges not recorded', record: { breaks: { found: [{ clock: 10 }] } } }],
  },
});
