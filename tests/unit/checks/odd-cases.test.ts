import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { checkRecord } from '../../../src/domain/checks/engine.ts';
import { withValue } from '../../../src/domain/record/paths.ts';
import type { CaseRecord } from '../../../src/domain/record/schema.ts';
import { recordOf } from './rule-tester.ts';

const fixture = (name: string): CaseRecord =>
  recordOf({
    record: JSON.parse(readFileSync(new URL(`../../fixtures/${name}.json`, import.meta.url), 'utf8')),
  });

const band = fixture('encircling-band-with-drainage');
const segment = fixture('segmental-buckle');
const pneumatic = fixture('pneumatic-retinopexy');
const vitrectomy = fixture('vitrectomy-with-gas');
const oil = fixture('vitrectomy-band-and-oil');

const changed = (record: CaseRecord, changes: Readonly<Record<string, unknown>>): CaseRecord =>
  recordOf({
    record: Object.entries(changes).reduce((all, [path, value]) => withValue(all, path, value), record),
  });

/* Unusual and right: of these nothing new may be said. */
const cases: readonly (readonly [name: string, record: CaseRecord, changes: Record<string, unknown>])[] = [
  [
    'a prophylactic laser all round beside the breaks',
    vitrectomy,
    {
      'retinopexy.treatments': [
        { modality: 'endolaser', targets: 'all-breaks', applications: 320 },
        { modality: 'endolaser', targets: 'circumferential', applications: 900 },
      ],
    },
  ],
  [
    'the fellow eye had the same operation before',
    vitrectomy,
    { 'before.previousOperations': [{ what: 'vitrectomy', eye: 'right', on: '2019-05-06' }] },
  ],
  ['no bubble is needed at a position', vitrectomy, { 'aftercare.posture': [{ position: 'free' }] }],
  [
    'a macular hole beside the tear, not treated',
    vitrectomy,
    {
      'breaks.found': [
        { kind: 'horseshoe', clock: 3.5, zone: 'equator', treatedBy: ['laser'], supportedByElements: 'none' },
        { kind: 'macular-hole', zone: 'posterior-pole', treatedBy: ['none'] },
      ],
      'retinopexy.treatments': [{ modality: 'endolaser', targets: [1], applications: 320 }],
      'aftercare.posture': [
        { position: 'face-down', hoursADay: 10, days: 3 },
        { position: 'right-side', hoursADay: 6, days: 3 },
      ],
    },
  ],
  [
    'general anaesthesia with a block for the pain afterwards',
    segment,
    {
      'anaesthesia.blockEye': 'right',
      'anaesthesia.agents': [{ drug: 'Levobupivacaine', concentrationPercent: 0.5, volumeMl: 3 }],
    },
  ],
  [
    'a block with sedation and an anaesthetist',
    vitrectomy,
    { 'anaesthesia.sedation': true, 'who.anaesthetist': 'Dr Corin Westerleigh' },
  ],
  ['the patient came without a referral', vitrectomy, { 'who.referrer': { kind: 'self' } }],
  ['a surgeon working alone', band, { 'who.assistants': 'none', 'who.supervisor': 'none' }],
  [
    'a band in tunnels in three quadrants, sewn in the fourth',
    band,
    {
      'buckle.elements.0.fixation': [
        { quadrant: 'superotemporal', kind: 'scleral-tunnel' },
        { quadrant: 'superonasal', kind: 'scleral-tunnel' },
        { quadrant: 'inferonasal', kind: 'scleral-tunnel' },
        { quadrant: 'inferotemporal', kind: 'mattress-suture', material: 'nylon' },
      ],
    },
  ],
  [
    'tunnels in three quadrants only',
    band,
    {
      'buckle.elements.0.fixation': [
        { quadrant: 'superotemporal', kind: 'scleral-tunnel' },
        { quadrant: 'superonasal', kind: 'scleral-tunnel' },
        { quadrant: 'inferonasal', kind: 'scleral-tunnel' },
      ],
    },
  ],
  [
    'a temporary band with an absorbable knot',
    band,
    {
      'buckle.elements.0.intention': 'temporary',
      'buckle.elements.0.closure': { kind: 'knot', material: 'polyglactin-910', endsMatch: true },
    },
  ],
  [
    'a temporary band with a sleeve that will be released',
    band,
    { 'buckle.elements.0.intention': 'temporary', 'aftercare.elementRemovalInMonths': 3 },
  ],
  ['a band laid without tension', band, { 'buckle.elements.0.shortenedMm': 0 }],
  [
    'the front edge further back in one quadrant',
    band,
    { 'buckle.elements.0.frontEdgeByQuadrantMm': { superonasal: 5 } },
  ],
  [
    'one permanent suture of a band absorbable, the others lasting',
    band,
    { 'buckle.elements.0.fixation.0.material': 'polyglactin-910' },
  ],
  ['oil in a pseudophakic eye without iridectomy', oil, { 'tamponade.iridectomy': 'none' }],
  [
    'an oil that stays for good, for a reason',
    oil,
    { 'aftercare.oilRemovalInMonths': undefined, 'aftercare.nextOperationOn': '2025-06-02' },
  ],
  ['heavy liquid exchanged directly for oil', oil, { 'tamponade.exchange': 'heavy-liquid-oil' }],
  ['a supervisor who was not scrubbed', oil, { 'who.supervisor.scrubbed': false }],
  [
    'a lens left aphakic under oil, with the iridectomy below',
    oil,
    {
      'vitreous.lensWork': 'lensectomy',
      'vitreous.lensImplant': 'not-applicable',
      'tamponade.iridectomy': 'inferior',
      'who.performed': ['encircling-band', 'vitrectomy', 'membrane-peel', 'laser', 'oil', 'lens-removal'],
      'who.whyChanged': 'The capsule gave way; the eye is left without an implant for now.',
    },
  ],
  [
    'iodine contrast allergy, prepared with povidone-iodine',
    band,
    { 'who.patient.allergies': [{ substance: 'iodine contrast medium' }] },
  ],
  ['latex allergy', band, { 'who.patient.allergies': [{ substance: 'latex', reaction: 'rash' }] }],
  [
    'aspirin continued through external drainage',
    band,
    { 'before.anticoagulants': [{ drug: 'aspirin', action: 'continued' }] },
  ],
  [
    'warfarin stopped before a needle block',
    vitrectomy,
    { 'before.anticoagulants': [{ drug: 'warfarin', action: 'stopped' }] },
  ],
  [
    'fluid left over a buckle that was not drained',
    segment,
    {
      drainage: { kind: 'none' },
      'endOfCase.retina': 'fluid-left',
      'endOfCase.fluidLeftWhere': 'over the buckle',
      'who.performed': ['segmental-buckle', 'cryotherapy', 'gas'],
      'who.planned': ['segmental-buckle', 'cryotherapy', 'gas'],
    },
  ],
  [
    'a plan that changed, with the reason',
    segment,
    {
      'who.planned': ['encircling-band', 'external-drainage', 'cryotherapy'],
      'who.whyChanged': 'One break only; a local element was enough.',
    },
  ],
  ['a lens implant that was chosen for short sight', oil, { 'vitreous.lensImplant.powerDioptres': 17 }],
  [
    'an operation past midnight',
    pneumatic,
    {
      'who.startedAt': '2024-03-04T23:50',
      'who.timeOutAt': '2024-03-04T23:45',
      'who.endedAt': '2024-03-05T00:20',
      'endOfCase.medicines': 'none',
      'aftercare.reviewAt': '2024-03-06T09:00',
      'aftercare.reviewInDays': undefined,
      'before.symptomsSince': '2024-03-01',
      'before.axialLengthMeasuredOn': undefined,
      'who.referrer.referredOn': undefined,
      'tamponade.expiresOn': undefined,
    },
  ],
  [
    'a second paracentesis was not needed',
    pneumatic,
    { 'tamponade.paracentesis': false, 'tamponade.paracentesisVolumeMl': undefined },
  ],
  [
    'a break on the border of the detachment, on flat retina',
    vitrectomy,
    { 'breaks.found.1.onDetachedRetina': false },
  ],
  [
    'a hole in flat retina treated as well',
    vitrectomy,
    {
      'breaks.found.1': {
        kind: 'round-hole',
        clock: 8,
        zone: 'equator',
        onDetachedRetina: false,
        treatedBy: ['laser'],
        supportedByElements: 'none',
      },
    },
  ],
  [
    'complications that were dealt with',
    vitrectomy,
    {
      'endOfCase.complications': [{ kind: 'iatrogenic-break', detail: 'at 11', action: 'lasered' }],
    },
  ],
  [
    'a discrepancy in the counts that was cleared up',
    band,
    {
      'endOfCase.counts': 'discrepancy',
      'endOfCase.countsNote': 'One needle was found under the table.',
    },
  ],
];

const said = (record: CaseRecord) => checkRecord(record).map(({ rule, message }) => `${rule}: ${message}`);

describe('odd, and right', () => {
  it.each(cases)('%s', (_, record, changes) => {
    const before = said(record);
    expect(said(changed(record, changes)).filter((flag) => !before.includes(flag))).toEqual([]);
  });
});
