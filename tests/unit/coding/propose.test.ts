import { describe, expect, it } from 'vitest';
import { proposeCodes } from '../../../src/domain/coding/propose.ts';
import type { CaseRecord } from '../../../src/domain/record/schema.ts';

type Stages = Omit<CaseRecord, 'version'>;

const codes = (stages: Stages, set: string) =>
  proposeCodes({ version: 1, ...stages })
    .proposed.filter((one) => one.set === set)
    .map(({ code, modifiers }) => [code, ...modifiers].join('-'));

const detached: Stages = {
  who: { eye: 'left' },
  before: { diagnosis: 'rhegmatogenous' },
  breaks: { found: [{ kind: 'horseshoe' }] },
};
const vitrectomy: Stages = { ...detached, vitreous: { vitrectomy: true } };

describe('diagnoses', () => {
  it.each<[string, Stages, string[]]>([
    ['one break, left', detached, ['H33.012']],
    [
      'two breaks, right',
      {
        ...detached,
        who: { eye: 'right' },
        breaks: { found: [{ kind: 'horseshoe' }, { kind: 'round-hole' }] },
      },
      ['H33.021'],
    ],
    ['no break', { ...detached, breaks: { found: 'none' } }, ['H33.002']],
    ['giant tear', { ...detached, endOfCase: { postoperativeDiagnosis: 'giant-tear' } }, ['H33.032']],
    ['dialysis, side not recorded', { before: { diagnosis: 'dialysis' } }, ['H33.049']],
    ['total', { ...detached, before: { diagnosis: 'rhegmatogenous', totalDetachment: true } }, ['H33.052']],
    [
      'traction: the fifth character',
      { who: { eye: 'right' }, before: { diagnosis: 'tractional' } },
      ['H33.41'],
    ],
    ['serous, side not recorded', { before: { diagnosis: 'serous' } }, ['H33.20']],
    [
      'horseshoe tear alone',
      {
        who: { eye: 'right' },
        before: { diagnosis: 'break-without-detachment' },
        breaks: { found: [{ kind: 'horseshoe' }] },
      },
      ['H33.311'],
    ],
    [
      'with haemorrhage',
      { ...detached, before: { diagnosis: 'rhegmatogenous', vitreousHaemorrhage: true } },
      ['H33.012', 'H43.12'],
    ],
  ])('%s', (_, stages, expected) => {
    expect(codes(stages, 'ICD-10-CM')).toEqual(expected);
  });
});

describe('procedures', () => {
  it.each<[string, Stages, string[]]>([
    [
      'vitrectomy takes in buckle, gas and cryotherapy',
      {
        ...vitrectomy,
        buckle: { elements: [{ role: 'encircling' }] },
        tamponade: { agent: 'SF6' },
        retinopexy: { treatments: [{ modality: 'cryo' }] },
      },
      ['67108-LT'],
    ],
    [
      'PVR with peeling is complex',
      {
        ...vitrectomy,
        before: { diagnosis: 'rhegmatogenous', pvr: { grade: 'CP' } },
        vitreous: { vitrectomy: true, membranesPeeled: ['preretinal'] },
      },
      ['67113-LT'],
    ],
    [
      'PVR without peeling is not',
      {
        ...vitrectomy,
        before: { diagnosis: 'rhegmatogenous', pvr: { grade: 'C2' } },
        vitreous: { vitrectomy: true, membranesPeeled: ['none'] },
      },
      ['67108-LT'],
    ],
    [
      'peeling alone is not',
      { ...vitrectomy, vitreous: { vitrectomy: true, membranesPeeled: ['epiretinal'] } },
      ['67108-LT'],
    ],
    [
      'buckle with cryotherapy and drainage',
      {
        ...detached,
        vitreous: { vitrectomy: false },
        buckle: { elements: [{ role: 'segment' }] },
        drainage: { kind: 'external' },
        retinopexy: { treatments: [{ modality: 'cryo' }] },
      },
      ['67107-LT'],
    ],
    [
      'gas injection',
      {
        ...detached,
        vitreous: { vitrectomy: false },
        buckle: { elements: 'none' },
        tamponade: { agent: 'SF6' },
        retinopexy: { treatments: [{ modality: 'cryo' }] },
      },
      ['67110-LT'],
    ],
    [
      'laser of a break without detachment',
      {
        who: { eye: 'right' },
        before: { diagnosis: 'break-without-detachment' },
        retinopexy: { treatments: [{ modality: 'indirect-laser' }] },
      },
      ['67145-RT'],
    ],
    ['nothing from an empty record', {}, []],
  ])('%s', (_, stages, expected) => {
    expect(codes(stages, 'CPT')).toEqual(expected);
  });

  it('says why the others do not apply', () => {
    const { rejected } = proposeCodes({
      version: 1,
      ...vitrectomy,
      buckle: { elements: [{ role: 'encircling' }] },
    });
    expect(rejected).toContainEqual({
      set: 'CPT',
      code: '67107',
      why: 'included in the vitrectomy for detachment',
    });
  });

  it('asks what the record does not say', () => {
    expect(
      proposeCodes({ version: 1, ...detached, before: { diagnosis: 'rhegmatogenous', recurrent: true } })
        .questions,
    ).toEqual([expect.stringContaining('modifier 78')]);
  });
});

it('names facts that exist behind each code', () => {
  for (const { because } of proposeCodes({ version: 1, ...vitrectomy }).proposed) {
    expect(because.length).toBeGreaterThan(0);
    for (const { words } of because) expect(words).toMatch(/^[A-Z].*: /);
  }
});
