import { defineRule } from '../../define-rule.ts';
import { capital, labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'membrane-dye-without-peel',
  family: 'vitreous',
  level: 'caution',
  title: 'A dye for the limiting membrane, and no membrane peeled',
  why: 'The dye is used to peel; the peel decides the code.',
  source: { text: 'CPT 67113: vitrectomy and membrane peel', certainty: 'R' },
  answerable: true,
  check: ({ vitreous }) => {
    const dyes = Array.isArray(vitreous?.dyes) ? vitreous.dyes : [];
    const at = dyes.findIndex(({ kind }) => kind === 'brilliant-blue' || kind === 'indocyanine-green');
    const peeled = vitreous?.membranesPeeled;
    if (at < 0 || peeled === undefined || peeled.some((one) => one !== 'none')) return [];
    return [
      {
        fields: ['vitreous.membranesPeeled', `vitreous.dyes.${at}.kind`],
        message: `${capital(labelOf('vitreous.dyes.kind', dyes[at]?.kind ?? ''))} is recorded as used, and membranes peeled as none.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'dye without peel',
        fields: 'vitreous.membranesPeeled',
        record: { vitreous: { dyes: [{ kind: 'brilliant-blue' }], membranesPeeled: ['none'] } },
      },
    ],
    silent: [
      {
        name: 'triamcinolone for the hyaloid',
        record: { vitreous: { dyes: [{ kind: 'triamcinolone' }], membranesPeeled: ['none'] } },
      },
      {
        name: 'peeled',
        record: { vitreous: { dyes: [{ kind: 'brilliant-blue' }], membranesPeeled: ['ilm'] } },
      },
    ],
    unknown: [
      { name: 'membranes not recorded', record: { vitreous: { dyes: [{ kind: 'brilliant-blue' }] } } },
    ],
  },
});
