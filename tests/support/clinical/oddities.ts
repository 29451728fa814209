import { type FieldPath, withValue } from '../../../src/domain/record/paths.ts';
import type { CaseRecord, Quadrant } from '../../../src/domain/record/schema.ts';
import { addMinutes } from './calendar.ts';
import { quadrantOf } from './globe.ts';
import type { Plan } from './planned.ts';

type Complication = Exclude<
  NonNullable<NonNullable<CaseRecord['endOfCase']>['complications']>,
  'none'
>[number];

const put = (record: CaseRecord, values: Readonly<Record<FieldPath, unknown>>): CaseRecord =>
  Object.entries(values).reduce((so, [path, value]) => withValue(so, path, value), record);

/** Something unusual that is nevertheless in order. `undefined` when this case cannot show it. */
interface Oddity {
  name: string;
  /** Share of all cases in which it is tried. */
  share: number;
  apply: (record: CaseRecord, plan: Plan) => CaseRecord | undefined;
}

const trouble = (
  record: CaseRecord,
  plan: Plan,
): [Complication, Readonly<Record<FieldPath, unknown>>] | undefined => {
  const { random, scenario } = plan;
  const phakic = plan.lens === 'phakic' && record.vitreous?.lensWork === 'none';
  const external = record.drainage?.kind === 'external';
  const options: [Complication, Readonly<Record<FieldPath, unknown>>][] = [
    [
      {
        kind: 'high-pressure',
        detail: 'Pale disc while the element was tied.',
        action: 'Paracentesis; disc pink again within a minute.',
      },
      { 'tamponade.paracentesis': true, 'tamponade.paracentesisVolumeMl': 0.2 },
    ],
    [
      {
        kind: 'corneal-oedema',
        detail: 'View hazy late in the case.',
        action: 'Epithelium moistened; not scraped.',
      },
      {},
    ],
  ];
  if (scenario.vitrectomy && phakic) {
    options.push([
      {
        kind: 'lens-touch',
        detail: 'Small, at 8 o’clock, capsule intact.',
        action: 'Left; patient to be told and lens watched.',
      },
      {},
    ]);
  }
  if (external) {
    options.push([
      {
        kind: 'subretinal-haemorrhage',
        detail: 'Small, at the drainage site, away from the macula.',
        action: 'Pressure on the globe raised until it stopped.',
      },
      {
        'drainage.outcome': 'haemorrhage',
        'endOfCase.retina': 'fluid-left',
        'endOfCase.fluidLeftWhere': 'a little fluid round the drainage site',
      },
    ]);
  }
  if (record.vitreous?.heavyLiquid === 'removed') {
    options.push([
      {
        kind: 'subretinal-heavy-liquid',
        detail: 'One small bubble, outside the arcades.',
        action: 'Aspirated through the break.',
      },
      {},
    ]);
  }
  return random.pick(options);
};

export const oddities: readonly Oddity[] = [
  {
    name: 'a complication that was dealt with',
    share: 0.06,
    apply: (record, plan) => {
      const found = trouble(record, plan);
      return found === undefined
        ? undefined
        : put(record, { 'endOfCase.complications': [found[0]], ...found[1] });
    },
  },
  {
    name: 'counts that did not agree at first',
    share: 0.01,
    apply: (record) =>
      put(record, {
        'endOfCase.counts': 'discrepancy',
        'endOfCase.countsNote':
          'One swab short at the first count; found in the drape; second count correct.',
      }),
  },
  {
    name: 'nitrous oxide, stopped in good time',
    share: 0.05,
    apply: (record, plan) => {
      const endedAt = record.who?.endedAt;
      if (!plan.general || endedAt === undefined) return undefined;
      return put(record, {
        'anaesthesia.nitrousOxideUsed': true,
        'anaesthesia.nitrousOxideStoppedAt': addMinutes(endedAt, -plan.random.whole(32, 38)),
      });
    },
  },
  {
    name: 'measured blood loss',
    share: 0.015,
    apply: (record, plan) =>
      put(record, { 'endOfCase.bloodLoss': 'measured', 'endOfCase.bloodLossMl': plan.random.whole(2, 15) }),
  },
  {
    name: 'a specimen',
    share: 0.015,
    apply: (record, plan) =>
      plan.scenario.vitrectomy
        ? put(record, {
            'endOfCase.specimens': [{ what: 'vitreous, 0.5 mL undiluted', sentTo: 'pathology' }],
          })
        : undefined,
  },
  {
    name: 'the fellow eye named in the remarks',
    share: 0.03,
    apply: (record, plan) =>
      put(record, {
        'endOfCase.remarks': `The fellow ${plan.eye === 'right' ? 'left' : 'right'} eye was examined under the same anaesthetic: retina flat, no breaks.`,
      }),
  },
  {
    name: 'a band that runs further back in one quadrant',
    share: 0.08,
    apply: (record, plan) => {
      if (plan.band === undefined) return undefined;
      const { widthMm: _, frontEdgeMm } = plan.band;
      const taken = plan.breaks.map((found) => quadrantOf(found.clock ?? 12, plan.eye));
      const free = (['superotemporal', 'superonasal', 'inferonasal', 'inferotemporal'] as Quadrant[]).filter(
        (quadrant) => !taken.includes(quadrant),
      );
      if (free.length === 0) return undefined;
      return put(record, {
        'buckle.elements.0.frontEdgeByQuadrantMm': { [plan.random.pick(free)]: frontEdgeMm + 0.5 },
      });
    },
  },
  {
    name: 'a band folded for height over one place',
    share: 0.05,
    apply: (record, plan) =>
      plan.band !== undefined && plan.band.widthMm >= 3.5
        ? put(record, {
            'buckle.elements.0.imbricatedOver': `break 1, ${plan.breaks[0]?.clock ?? 12} o’clock`,
          })
        : undefined,
  },
  {
    name: 'an old element taken off',
    share: 0.4,
    apply: (record, plan) => {
      const earlier = record.before?.previousOperations;
      const old = Array.isArray(earlier) && earlier.some((operation) => operation.what === 'scleral-buckle');
      if (!old || !plan.redo) return undefined;
      return put(record, {
        'who.performed': [...(record.who?.performed ?? []), 'element-removal'],
        'who.planned': [...(record.who?.planned ?? []), 'element-removal'],
        'buckle.peritomy': 'limited',
        'buckle.conjunctivalClosure': 'polyglactin-910',
        'endOfCase.extraSteps': 'The segment from the earlier operation was loose and was removed whole.',
      });
    },
  },
  {
    name: 'no posture for a little air beside a buckle that holds every break',
    share: 0.3,
    apply: (record, plan) =>
      plan.agent === 'air' && !plan.scenario.vitrectomy && plan.scenario.buckle !== 'none'
        ? put(record, { 'aftercare.posture': 'none' })
        : undefined,
  },
  {
    name: 'an iridectomy from before',
    share: 0.5,
    apply: (record, plan) =>
      plan.lens === 'aphakic' && record.tamponade?.iridectomy === 'inferior'
        ? put(record, { 'tamponade.iridectomy': 'present' })
        : undefined,
  },
  {
    name: 'an operation that ran past midnight',
    share: 0.004,
    apply: (record, plan) => {
      if (plan.general || plan.scenario.name === 'pneumatic retinopexy') return undefined;
      const next = `${record.who?.endedAt?.slice(0, 10) ?? plan.on}`;
      const [day, after] = [next, addMinutes(`${next}T12:00`, 1440).slice(0, 10)];
      const medicines = record.endOfCase?.medicines;
      return put(record, {
        'who.timeOutAt': `${day}T23:06`,
        'who.startedAt': `${day}T23:10`,
        'who.endedAt': `${after}T00:32`,
        'who.urgency': 'emergency',
        ...(Array.isArray(medicines)
          ? {
              'endOfCase.medicines': medicines.map((medicine) => ({
                ...medicine,
                givenAt: `${after}T00:29`,
              })),
            }
          : {}),
        'aftercare.reviewAt': `${after}T14:00`,
        'aftercare.reviewInDays': 0,
      });
    },
  },
  {
    name: 'a plan that was changed, with the reason',
    share: 0.06,
    apply: (record) => {
      const performed = record.who?.performed ?? [];
      const [kept, why] = performed.includes('external-drainage')
        ? [
            performed.filter((name) => name !== 'external-drainage'),
            'Fluid under the break was too deep for it to reach the element, so it was drained.',
          ]
        : performed.includes('oil')
          ? [
              performed.map((name) => (name === 'oil' ? 'gas' : name)),
              'The membranes were wider than expected; oil in place of gas.',
            ]
          : performed.includes('encircling-band') && performed.includes('vitrectomy')
            ? [
                performed.filter((name) => name !== 'encircling-band'),
                'Further breaks were found below; a band was added.',
              ]
            : [undefined, ''];
      return kept === undefined
        ? undefined
        : put(record, { 'who.planned': [...new Set(kept)], 'who.whyChanged': why });
    },
  },
];

/** The record with whatever odd but sound things chance brings. */
export const withOddities = (record: CaseRecord, plan: Plan): CaseRecord =>
  oddities.reduce(
    (so, oddity) => (plan.random.chance(oddity.share) ? (oddity.apply(so, plan) ?? so) : so),
    record,
  );
