import { defineRule } from '../../define-rule.ts';
import { labelOf, listWords, numberIn, retinotomiesOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'vitrectomy-details-without-vitrectomy',
  family: 'vitreous',
  level: 'contradiction',
  title: 'No vitrectomy, and steps that need one',
  why: 'Vitrectomy changes the code, the lens’s future and the advice.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: (record) => {
    const { vitreous } = record;
    if (vitreous?.vitrectomy !== false) return [];
    const peeled = (vitreous.membranesPeeled ?? []).filter((one) => one !== 'none');
    const steps = [
      numberIn(vitreous.ports) !== undefined && vitreous.ports !== 0
        ? { field: 'vitreous.ports', what: `${vitreous.ports} ports` }
        : undefined,
      vitreous.baseShaved?.startsWith('shaved') === true
        ? { field: 'vitreous.baseShaved', what: 'a shaved vitreous base' }
        : undefined,
      peeled.length > 0
        ? {
            field: 'vitreous.membranesPeeled',
            what: `${listWords(peeled.map((one) => labelOf('vitreous.membranesPeeled', one)))} peeled`,
          }
        : undefined,
      retinotomiesOf(record).length > 0
        ? { field: 'vitreous.retinotomies', what: 'a retinotomy' }
        : undefined,
      vitreous.heavyLiquid !== undefined && vitreous.heavyLiquid !== 'none'
        ? {
            field: 'vitreous.heavyLiquid',
            what: `heavy liquid ${labelOf('vitreous.heavyLiquid', vitreous.heavyLiquid)}`,
          }
        : undefined,
    ].filter((one) => one !== undefined);
    if (steps.length === 0) return [];
    return [
      {
        fields: ['vitreous.vitrectomy', ...steps.map(({ field }) => field)],
        message: `No vitrectomy is recorded, with ${listWords(steps.map(({ what }) => what))}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'membranes peeled',
        fields: 'vitreous.vitrectomy',
        record: { vitreous: { vitrectomy: false, membranesPeeled: ['epiretinal'] } },
      },
    ],
    silent: [
      {
        name: 'nothing of it',
        record: { vitreous: { vitrectomy: false, ports: 'not-applicable', heavyLiquid: 'none' } },
      },
    ],
    unknown: [{ name: 'vitrectomy not recorded', record: { vitreous: { ports: 3 } } }],
  },
});
