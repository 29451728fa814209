import { defineRule } from '../../define-rule.ts';
import { elementsOf, gasOf, labelOf, oilOf, treatmentsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'performed-against-stages',
  family: 'standards',
  level: 'contradiction',
  title: 'The procedures performed do not match what the stages record',
  why: 'The coder and the register read the list, the surgeon writes the stages.',
  source: { text: '42 CFR 482.51(b)(6), tag A-0959: name of the procedure', certainty: 'R2' },
  answerable: false,
  check: (record) => {
    const performed = record.who?.performed;
    if (performed === undefined) return [];
    const elements = record.buckle?.elements;
    const roles = elementsOf(record).map(({ role }) => role);
    const agent = record.tamponade?.agent;
    const treatments = record.retinopexy?.treatments;
    const modalities = treatmentsOf(record).map(({ modality }) => modality);
    const lasers = modalities.some((one) => one?.includes('laser') === true);
    const rolesKnown = elements === 'none' || (elements !== undefined && !roles.includes(undefined));
    const modalitiesKnown =
      treatments === 'none' || (treatments !== undefined && !modalities.includes(undefined));
    const kind = record.drainage?.kind;
    const facts = [
      { procedure: 'vitrectomy', done: record.vitreous?.vitrectomy, field: 'vitreous.vitrectomy' },
      {
        procedure: 'encircling-band',
        done: rolesKnown ? roles.includes('encircling') : undefined,
        field: 'buckle.elements',
      },
      {
        procedure: 'gas',
        done: agent === undefined ? undefined : gasOf(record) !== undefined,
        field: 'tamponade.agent',
      },
      {
        procedure: 'oil',
        done: agent === undefined ? undefined : oilOf(record) !== undefined,
        field: 'tamponade.agent',
      },
      {
        procedure: 'external-drainage',
        done: kind === undefined ? undefined : kind === 'external' || kind === 'both',
        field: 'drainage.kind',
      },
      {
        procedure: 'cryotherapy',
        done: modalitiesKnown ? modalities.includes('cryo') : undefined,
        field: 'retinopexy.treatments',
      },
      { procedure: 'laser', done: modalitiesKnown ? lasers : undefined, field: 'retinopexy.treatments' },
    ] as const;
    const wrong = facts.filter(({ procedure, done }) => {
      const listed = performed.includes(procedure);
      if (procedure === 'gas' && (agent === 'air' || performed.includes('pneumatic-retinopexy')))
        return false;
      return done !== undefined && listed !== done;
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
        message: `Procedures performed: ${parts.join('; ')}.`,
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
        name: 'oil in, gas listed',
        fields: 'who.performed',
        record: { who: { performed: ['gas'] }, tamponade: { agent: 'silicone-oil' } },
      },
    ],
    silent: [
      {
        name: 'agree',
        record: {
          who: { performed: ['vitrectomy', 'gas'] },
          vitreous: { vitrectomy: true },
          tamponade: { agent: 'SF6' },
        },
      },
    ],
    unknown: [{ name: 'stages not recorded', record: { who: { performed: ['vitrectomy', 'gas'] } } }],
  },
});
