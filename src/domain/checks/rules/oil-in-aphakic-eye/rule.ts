import { defineRule } from '../../define-rule.ts';
import { labelOf, lensImplantOf, oilOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'oil-in-aphakic-eye',
  family: 'tamponade',
  level: 'omission',
  title: 'Oil in an aphakic eye without an iridectomy on the right side',
  why: 'Without it oil blocks the pupil and comes forward.',
  source: { text: 'Inferior iridectomy for light oil, superior for heavy', certainty: 'R' },
  answerable: true,
  check: (record) => {
    const oil = oilOf(record);
    const work = record.vitreous?.lensWork;
    const implant = record.vitreous?.lensImplant;
    const lensGone =
      (work === 'lensectomy' || work === 'implant-removed') &&
      (implant === undefined || implant === 'not-applicable');
    const implanted = lensImplantOf(record) !== undefined;
    const aphakic = !implanted && (record.before?.lens === 'aphakic' || lensGone);
    const { iridectomy } = record.tamponade ?? {};
    if (oil === undefined || !aphakic || iridectomy === 'present') return [];
    const wanted = oil === 'heavy-oil' ? 'superior' : 'inferior';
    if (iridectomy === wanted) return [];
    const done =
      iridectomy === undefined
        ? 'no iridectomy is recorded'
        : iridectomy === 'none'
          ? 'the iridectomy is recorded as none'
          : `the iridectomy is ${iridectomy}`;
    return [
      {
        fields: ['tamponade.iridectomy', 'before.lens'],
        message: `The eye is aphakic with ${labelOf('tamponade.agent', oil)}; ${done}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'none',
        fields: 'tamponade.iridectomy',
        record: { before: { lens: 'aphakic' }, tamponade: { agent: 'silicone-oil' } },
      },
      {
        name: 'superior under light oil',
        fields: 'tamponade.iridectomy',
        record: { before: { lens: 'aphakic' }, tamponade: { agent: 'silicone-oil', iridectomy: 'superior' } },
      },
    ],
    silent: [
      {
        name: 'inferior',
        record: { before: { lens: 'aphakic' }, tamponade: { agent: 'silicone-oil', iridectomy: 'inferior' } },
      },
      {
        name: 'pseudophakic',
        record: { before: { lens: 'pseudophakic' }, tamponade: { agent: 'silicone-oil' } },
      },
    ],
    unknown: [{ name: 'lens not recorded', record: { tamponade: { agent: 'silicone-oil' } } }],
  },
});
