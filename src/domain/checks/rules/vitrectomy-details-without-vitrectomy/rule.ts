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
    const { ports, gauge, heavyLiquid: liquid } = vitreous;
    const peeled = (vitreous.membranesPeeled ?? []).filter((one) => one !== 'none');
    const steps = [
      numberIn(ports) !== undefined && ports !== 0
        ? { field: 'vitreous.ports', what: `${ports} ports` }
        : undefined,
      gauge !== undefined && gauge !== 'not-applicable'
        ? { field: 'vitreous.gauge', what: `${gauge} gauge` }
        : undefined,
      vitreous.hyaloid === 'induced'
        ? { field: 'vitreous.hyaloid', what: 'a detachment of the hyaloid induced' }
        : undefined,
      vitreous.baseShaved?.startsWith('shaved') === true
        ? { field: 'vitreous.baseShaved', what: 'the vitreous base shaved' }
        : undefined,
      Array.isArray(vitreous.dyes) ? { field: 'vitreous.dyes', what: 'a dye' } : undefined,
      peeled.length > 0
        ? {
            field: 'vitreous.membranesPeeled',
            what: `${listWords(peeled.map((one) => labelOf('vitreous.membranesPeeled', one)))} peeled`,
          }
        : undefined,
      retinotomiesOf(record).length > 0
        ? { field: 'vitreous.retinotomies', what: 'a retinotomy' }
        : undefined,
      liquid !== undefined && liquid !== 'none'
        ? { field: 'vitreous.heavyLiquid', what: `heavy liquid ${labelOf('vitreous.heavyLiquid', liquid)}` }
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
        record: { vitreous: { vitrectomy: false, membranesPeeled: ['ilm'] } },
      },
      {
        name: 'a gauge',
        fields: 'vitreous.vitrectomy',
        record: { vitreous: { vitrectomy: false, gauge: '25' } },
      },
    ],
    silent: [
      { name: 'vitrectomy', record: { vitreous: { vitrectomy: true, membranesPeeled: ['ilm'] } } },
      {
        name: 'buckle',
        record: {
          vitreous: {
            vitrectomy: false,
            membranesPeeled: ['none'],
            heavyLiquid: 'none',
            gauge: 'not-applicable',
            dyes: 'none',
            retinotomies: 'none',
          },
        },
      },
    ],
    unknown: [{ name: 'vitrectomy not recorded', record: { vitreous: { membranesPeeled: ['ilm'] } } }],
  },
});
