import { defineRule } from '../../define-rule.ts';
import { listWords, missingFrom } from '../../facts.ts';

export const rule = defineRule({
  id: 'vitrectomy-incomplete',
  family: 'vitreous',
  level: 'omission',
  title: 'A vitrectomy without the hyaloid, the gauge, heavy liquid or the closure of the ports',
  why: 'Vitreous left, heavy liquid left and open ports explain most of what goes wrong in the first weeks.',
  source: {
    text: 'RC.02.01.03; Royal College of Surgeons of England, Good Surgical Practice 2014: findings, closure',
    certainty: 'R2',
  },
  answerable: true,
  check: ({ vitreous }) => {
    if (vitreous?.vitrectomy !== true) return [];
    const missing = missingFrom([
      { field: 'vitreous.gauge', what: 'the gauge', value: vitreous.gauge },
      { field: 'vitreous.hyaloid', what: 'the posterior hyaloid', value: vitreous.hyaloid },
      { field: 'vitreous.baseShaved', what: 'the vitreous base', value: vitreous.baseShaved },
      { field: 'vitreous.heavyLiquid', what: 'heavy liquid, used or not', value: vitreous.heavyLiquid },
      { field: 'vitreous.lensWork', what: 'the lens, touched or not', value: vitreous.lensWork },
      {
        field: 'vitreous.sclerotomyClosure',
        what: 'the closure of the sclerotomies',
        value: vitreous.sclerotomyClosure,
      },
    ]);
    if (missing.length === 0) return [];
    return [
      {
        fields: missing.map(({ field }) => field),
        message: `A vitrectomy is recorded without ${listWords(missing.map(({ what }) => what))}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'hyaloid not said',
        fields: 'vitreous.hyaloid',
        record: {
          vitreous: {
            vitrectomy: true,
            gauge: '25',
            baseShaved: 'shaved',
            heavyLiquid: 'none',
            lensWork: 'none',
            sclerotomyClosure: 'sutureless',
          },
        },
      },
    ],
    silent: [
      {
        name: 'complete',
        record: {
          vitreous: {
            vitrectomy: true,
            gauge: '25',
            hyaloid: 'already-detached',
            baseShaved: 'shaved',
            heavyLiquid: 'none',
            lensWork: 'none',
            sclerotomyClosure: 'sutureless',
          },
        },
      },
      { name: 'no vitrectomy', record: { vitreous: { vitrectomy: false } } },
    ],
    unknown: [{ name: 'vitrectomy not recorded', record: { vitreous: { gauge: '25' } } }],
  },
});
