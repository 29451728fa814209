import { Engine } from 'json-rules-engine';
import type { CaseRecord } from '../../src/domain/record/schema.ts';

/*
 * Rules of ours that a general engine can express (this field says so, that one says otherwise or nothing), written out again
 * for it, to set its cost beside ours.
 */

type Test = readonly [
  path: string,
  operator: 'is' | 'isNot' | 'absent' | 'above' | 'below',
  value?: string | number | boolean,
];

interface Expressed {
  /** Id of our rule. */
  id: string;
  all: readonly Test[];
}

const required = (id: string, path: string): Expressed => ({ id, all: [[path, 'absent']] });

export const expressed: readonly Expressed[] = [
  {
    id: 'total-detachment-macula-on',
    all: [
      ['before.totalDetachment', 'is', true],
      ['before.macula', 'is', 'on'],
    ],
  },
  {
    id: 'macula-on-for-days-off',
    all: [
      ['before.macula', 'is', 'on'],
      ['before.maculaOffDays', 'above', 0],
    ],
  },
  {
    id: 'pvr-extent-missing',
    all: [
      ['before.pvr.grade', 'is', 'CP'],
      ['before.pvr.clockHours', 'absent'],
    ],
  },
  {
    id: 'pvr-extent-missing',
    all: [
      ['before.pvr.grade', 'is', 'CA'],
      ['before.pvr.clockHours', 'absent'],
    ],
  },
  {
    id: 'pvr-grade-of-other-edition',
    all: [
      ['before.pvr.edition', 'is', '1991'],
      ['before.pvr.grade', 'is', 'D1'],
    ],
  },
  {
    id: 'pvr-grade-of-other-edition',
    all: [
      ['before.pvr.edition', 'is', '1983'],
      ['before.pvr.grade', 'is', 'CP'],
    ],
  },
  {
    id: 'detachment-without-detachment',
    all: [
      ['before.diagnosis', 'is', 'break-without-detachment'],
      ['before.macula', 'is', 'off'],
    ],
  },
  {
    id: 'disc-not-perfused-unresolved',
    all: [
      ['endOfCase.discPerfused', 'is', false],
      ['endOfCase.complications', 'is', 'none'],
    ],
  },
  {
    id: 'internal-drainage-without-vitrectomy',
    all: [
      ['drainage.kind', 'is', 'internal'],
      ['vitreous.vitrectomy', 'is', false],
    ],
  },
  {
    id: 'drainage-retinotomy-missing',
    all: [
      ['drainage.internalThrough', 'is', 'retinotomy'],
      ['vitreous.retinotomies', 'is', 'none'],
    ],
  },
  {
    id: 'drainage-without-outcome',
    all: [
      ['drainage.kind', 'is', 'external'],
      ['drainage.outcome', 'absent'],
    ],
  },
  {
    id: 'drainage-details-without-drainage',
    all: [
      ['drainage.kind', 'is', 'none'],
      ['drainage.outcome', 'isNot', 'dry'],
    ],
  },
  {
    id: 'fluid-against-flat',
    all: [
      ['endOfCase.retina', 'is', 'flat'],
      ['endOfCase.breaksClosed', 'is', 'none'],
    ],
  },
  {
    id: 'gas-concentration-missing',
    all: [
      ['tamponade.agent', 'is', 'SF6'],
      ['tamponade.concentrationPercent', 'absent'],
    ],
  },
  {
    id: 'gas-concentration-missing',
    all: [
      ['tamponade.agent', 'is', 'C3F8'],
      ['tamponade.concentrationPercent', 'absent'],
    ],
  },
  {
    id: 'pure-gas-at-full-fill',
    all: [
      ['tamponade.mixing', 'is', 'pure'],
      ['tamponade.fillPercent', 'above', 50],
    ],
  },
  {
    id: 'expansile-concentration',
    all: [
      ['tamponade.agent', 'is', 'SF6'],
      ['tamponade.concentrationPercent', 'above', 20],
    ],
  },
  {
    id: 'expansile-concentration',
    all: [
      ['tamponade.agent', 'is', 'C3F8'],
      ['tamponade.concentrationPercent', 'above', 16],
    ],
  },
  {
    id: 'tamponade-details-without-agent',
    all: [
      ['tamponade.agent', 'is', 'none'],
      ['tamponade.fillPercent', 'above', 0],
    ],
  },
  {
    id: 'oil-without-viscosity',
    all: [
      ['tamponade.agent', 'is', 'silicone-oil'],
      ['tamponade.viscosityCentistokes', 'absent'],
    ],
  },
  {
    id: 'oil-without-removal-plan',
    all: [
      ['tamponade.agent', 'is', 'silicone-oil'],
      ['aftercare.oilRemovalInMonths', 'absent'],
    ],
  },
  {
    id: 'oil-in-aphakic-eye',
    all: [
      ['tamponade.agent', 'is', 'silicone-oil'],
      ['before.lens', 'is', 'aphakic'],
      ['tamponade.iridectomy', 'isNot', 'inferior'],
    ],
  },
  {
    id: 'heavy-liquid-left',
    all: [
      ['vitreous.heavyLiquid', 'is', 'left'],
      ['vitreous.heavyLiquidRemovalPlannedOn', 'absent'],
    ],
  },
  {
    id: 'heavy-liquid-use-not-recorded',
    all: [
      ['vitreous.heavyLiquid', 'is', 'none'],
      ['tamponade.exchange', 'is', 'heavy-liquid-oil'],
    ],
  },
  {
    id: 'gas-without-posture',
    all: [
      ['tamponade.agent', 'is', 'SF6'],
      ['aftercare.posture', 'absent'],
    ],
  },
  {
    id: 'gas-advice-missing',
    all: [
      ['tamponade.agent', 'is', 'SF6'],
      ['aftercare.flyingAdviceGiven', 'absent'],
    ],
  },
  {
    id: 'gas-advice-not-given',
    all: [
      ['tamponade.agent', 'is', 'SF6'],
      ['aftercare.flyingAdviceGiven', 'is', false],
    ],
  },
  {
    id: 'nitrous-oxide-and-gas',
    all: [
      ['anaesthesia.nitrousOxideUsed', 'is', true],
      ['anaesthesia.nitrousOxideStoppedAt', 'absent'],
    ],
  },
  {
    id: 'complications-against-outcome',
    all: [
      ['endOfCase.complications', 'is', 'none'],
      ['drainage.outcome', 'is', 'haemorrhage'],
    ],
  },
  {
    id: 'count-discrepancy-open',
    all: [
      ['endOfCase.counts', 'is', 'discrepancy'],
      ['endOfCase.countsNote', 'absent'],
    ],
  },
  {
    id: 'measured-blood-loss-missing',
    all: [
      ['endOfCase.bloodLoss', 'is', 'measured'],
      ['endOfCase.bloodLossMl', 'absent'],
    ],
  },
  { id: 'pressure-at-end', all: [['endOfCase.pressureMmHg', 'above', 35]] },
  { id: 'pressure-at-end', all: [['endOfCase.pressureMmHg', 'below', 5]] },
  {
    id: 'hyaloid-against-before',
    all: [
      ['before.posteriorVitreousDetachment', 'is', 'none'],
      ['vitreous.hyaloid', 'is', 'already-detached'],
    ],
  },
  { id: 'sclerotomies-off-pars-plana', all: [['vitreous.sclerotomiesMm', 'above', 4.5]] },
  { id: 'sclerotomies-off-pars-plana', all: [['vitreous.sclerotomiesMm', 'below', 3]] },
  {
    id: 'lens-work-against-lens',
    all: [
      ['before.lens', 'is', 'pseudophakic'],
      ['vitreous.lensWork', 'is', 'phacoemulsification'],
    ],
  },
  {
    id: 'block-against-anaesthesia',
    all: [
      ['anaesthesia.kind', 'is', 'peribulbar'],
      ['anaesthesia.blockEye', 'is', 'not-applicable'],
    ],
  },
  {
    id: 'block-eye-missing',
    all: [
      ['anaesthesia.kind', 'is', 'peribulbar'],
      ['anaesthesia.blockEye', 'absent'],
    ],
  },
  {
    id: 'anaesthetist-missing',
    all: [
      ['anaesthesia.kind', 'is', 'general'],
      ['who.anaesthetist', 'absent'],
    ],
  },
  {
    id: 'steroid-and-antibiotic-missing',
    all: [
      ['aftercare.drops', 'is', 'none'],
      ['vitreous.vitrectomy', 'is', true],
    ],
  },
  { id: 'late-review', all: [['aftercare.reviewInDays', 'above', 15]] },
  required('required-anaesthesia', 'anaesthesia.kind'),
  required('required-findings', 'breaks.found'),
  required('required-before', 'before.diagnosis'),
  required('required-steps', 'tamponade.agent'),
  required('required-end', 'endOfCase.complications'),
  required('required-aftercare', 'aftercare.drops'),
];

const operators = { is: 'equal', isNot: 'notEqual', above: 'greaterThan', below: 'lessThan' } as const;

const condition = ([fact, operator, value]: Test) =>
  operator === 'absent'
    ? { fact, operator: 'equal', value: '(absent)' }
    : { fact, operator: operators[operator], value: value ?? '' };

const facts = [...new Set(expressed.flatMap(({ all }) => all.map(([path]) => path)))];

const factAt = (record: CaseRecord, path: string): unknown => {
  let value: unknown = record;
  for (const key of path.split('.')) {
    if (typeof value !== 'object' || value === null) return '(absent)';
    value = Reflect.get(value, key);
  }
  return value ?? '(absent)';
};

/** The general engine with those rules; each run is given the facts of one record. */
export const generalEngine = (): ((record: CaseRecord) => Promise<number>) => {
  const engine = new Engine();
  for (const { id, all } of expressed) {
    engine.addRule({ conditions: { all: all.map(condition) }, event: { type: id } });
  }
  return async (record) => {
    const given = Object.fromEntries(facts.map((path) => [path, factAt(record, path)]));
    const { events } = await engine.run(given);
    return events.length;
  };
};
