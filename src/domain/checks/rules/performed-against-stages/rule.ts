import { defineRule } from '../../define-rule.ts';
import { labelOf, listWords } from '../../facts.ts';
import { recordedProcedures } from '../../procedures-recorded.ts';

export const rule = defineRule({
  id: 'performed-against-stages',
  family: 'standards',
  level: 'contradiction',
  title: 'The procedures performed do not match what the stages record',
  why: 'The coder and the register read the list, the surgeon writes the stages.',
  source: { text: '42 CFR 482.51(b)(6), tag A-0959: name of the procedure', certainty: 'R2' },
  answerable: false,
  unless: ['pneumatic-with-vitrectomy'],
  check: (record) => {
    const performed = record.who?.performed;
    if (performed === undefined) return [];
    const wrong = recordedProcedures(record).filter(({ procedure, done, listedOnly }) => {
      const listed = performed.includes(procedure);
      if (done === undefined || listed === done) return false;
      return listed || listedOnly !== true;
    });
    if (wrong.length === 0) return [];
    const parts = wrong.map(({ procedure, done }) => {
      const name = labelOf('who.performed', procedure);
      return done === true
        ? `${name} is recorded in its stage and not in the list`
        : `${name} is in the list and not recorded in its stage`;
    });
    return [
      {
        fields: ['who.performed', ...wrong.map(({ field }) => field)],
        message: `Procedures performed are listed as ${listWords(performed.map((one) => labelOf('who.performed', one)))}; ${parts.join('; ')}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'vitrectomy listed, not done',
        fields: 'who.performed',
        record: { who: { performed: ['vitrectomy'] }, vitreous: { vitrectomy: false } },
      },
      {
        name: 'band done, not listed',
        fields: 'who.performed',
        record: { who: { performed: ['vitrectomy'] }, buckle: { elements: [{ role: 'encircling' }] } },
      },
      {
        name: 'peel listed, nothing peeled',
        fields: 'who.performed',
        record: { who: { performed: ['membrane-peel'] }, vitreous: { membranesPeeled: ['none'] } },
      },
      {
        name: 'lens taken out, not listed',
        fields: 'who.performed',
        record: {
          who: { performed: ['vitrectomy'] },
          vitreous: { vitrectomy: true, lensWork: 'lensectomy' },
        },
      },
      {
        name: 'retinectomy not listed',
        fields: 'who.performed',
        record: {
          who: { performed: ['vitrectomy'] },
          vitreous: { vitrectomy: true, retinotomies: [{ kind: 'retinectomy' }] },
        },
      },
    ],
    silent: [
      {
        name: 'as listed',
        record: {
          who: { performed: ['vitrectomy', 'gas'] },
          vitreous: { vitrectomy: true },
          tamponade: { agent: 'SF6' },
        },
      },
      {
        name: 'a drainage retinotomy is part of the vitrectomy',
        record: {
          who: { performed: ['vitrectomy'] },
          vitreous: { vitrectomy: true, retinotomies: [{ kind: 'drainage' }] },
        },
      },
      {
        name: 'a radial element under the band',
        record: {
          who: { performed: ['encircling-band'] },
          buckle: { elements: [{ role: 'encircling' }, { role: 'meridional' }] },
        },
      },
      {
        name: 'limiting membrane peeled in a vitrectomy',
        record: {
          who: { performed: ['vitrectomy'] },
          vitreous: { vitrectomy: true, membranesPeeled: ['ilm'] },
        },
      },
    ],
    unknown: [{ name: 'stages not recorded', record: { who: { performed: ['vitrectomy', 'gas'] } } }],
  },
});
