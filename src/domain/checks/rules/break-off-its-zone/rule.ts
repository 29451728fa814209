import { equatorMm, globeOf, poleMm } from '../../../anatomy/globe.ts';
import { defineRule } from '../../define-rule.ts';
import { breaksOf, labelOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'break-off-its-zone',
  family: 'breaks',
  level: 'contradiction',
  title: 'A break’s edges lie far from its zone',
  why: 'Zone and caliper cannot both be right, and the support is worked out from them.',
  source: {
    text: 'Ora 5 to 8.5 mm and equator about 12.7 mm behind the limbus in a 24 mm eye',
    certainty: 'C',
  },
  answerable: false,
  check: (record) => {
    const axialLengthMm = record.before?.axialLengthMm;
    if (axialLengthMm === undefined) return [];
    const equator = equatorMm(globeOf(axialLengthMm));
    return breaksOf(record).flatMap(({ zone, frontEdgeMm, backEdgeMm }, index) => {
      if (zone === undefined || frontEdgeMm === undefined) return [];
      const back = backEdgeMm ?? poleMm(globeOf(axialLengthMm));
      const wrong =
        (zone === 'ora' && frontEdgeMm > 11) ||
        (zone === 'pre-equatorial' && frontEdgeMm > equator + 1) ||
        (zone === 'equator' && (frontEdgeMm > equator + 3.5 || back < equator - 4)) ||
        (zone === 'post-equatorial' && back < equator - 1) ||
        (zone === 'posterior-pole' && back < equator + 3);
      if (!wrong) return [];
      const message = `Break ${index + 1} is recorded ${labelOf('breaks.found.zone', zone)}; its front edge is ${numberWords(frontEdgeMm)} mm behind the limbus, and the equator of this eye lies at about ${numberWords(Math.round(equator * 10) / 10)} mm.`;
      return [{ fields: [`breaks.found.${index}.zone`, `breaks.found.${index}.frontEdgeMm`], message }];
    });
  },
  examples: {
    fires: [
      {
        name: 'at the ora, 16 mm back',
        fields: 'breaks.found.0.zone',
        record: { before: { axialLengthMm: 24 }, breaks: { found: [{ zone: 'ora', frontEdgeMm: 16 }] } },
      },
    ],
    silent: [
      {
        name: 'equatorial',
        record: {
          before: { axialLengthMm: 24 },
          breaks: { found: [{ zone: 'equator', frontEdgeMm: 12, backEdgeMm: 13.5 }] },
        },
      },
    ],
    unknown: [{ name: 'not measured', record: { breaks: { found: [{ zone: 'ora' }] } } }],
  },
});
