import type { Procedure } from '../../domain/record/procedures.ts';
import type { CaseRecord, Eye } from '../../domain/record/schema.ts';
import { nearlyComplete } from './nearly-complete.ts';

interface Invented {
  familyName: string;
  givenName: string;
  dateOfBirth: string;
  number: string;
  eye: Eye;
  planned: Procedure[];
  allergies: 'none' | { substance: string }[];
  referrer: string;
  familyDoctor: string;
}

/** Patients that nobody is, on the list of the demonstration's first day. */
const invented: readonly Invented[] = [
  {
    familyName: 'Oakhollow',
    givenName: 'Maren',
    dateOfBirth: '1961-03-14',
    number: 'DEMO-20417',
    eye: 'left',
    planned: ['vitrectomy', 'encircling-band', 'cryotherapy', 'gas'],
    allergies: [{ substance: 'penicillin' }],
    referrer: 'Fern Mossgrove',
    familyDoctor: 'Dr Hazel Underwillow',
  },
  {
    familyName: 'Thistledown',
    givenName: 'Orrin',
    dateOfBirth: '1988-07-02',
    number: 'DEMO-20418',
    eye: 'right',
    planned: ['encircling-band', 'external-drainage', 'cryotherapy'],
    allergies: 'none',
    referrer: 'Fern Mossgrove',
    familyDoctor: 'Dr Hazel Underwillow',
  },
  {
    familyName: 'Quillfeather',
    givenName: 'Ysolde',
    dateOfBirth: '1954-11-23',
    number: 'DEMO-20419',
    eye: 'right',
    planned: ['vitrectomy', 'laser', 'gas'],
    allergies: 'none',
    referrer: 'Bram Larkwood',
    familyDoctor: 'Dr Perrin Alderbank',
  },
  {
    familyName: 'Emberleigh',
    givenName: 'Tobin',
    dateOfBirth: '1970-01-30',
    number: 'DEMO-20420',
    eye: 'left',
    planned: ['pneumatic-retinopexy', 'cryotherapy'],
    allergies: [{ substance: 'povidone-iodine' }],
    referrer: 'Bram Larkwood',
    familyDoctor: 'Dr Perrin Alderbank',
  },
  {
    familyName: 'Brackenridge',
    givenName: 'Ilse',
    dateOfBirth: '1947-05-09',
    number: 'DEMO-20421',
    eye: 'left',
    planned: ['vitrectomy', 'membrane-peel', 'oil'],
    allergies: 'none',
    referrer: 'Dr Perrin Alderbank',
    familyDoctor: 'Dr Perrin Alderbank',
  },
];

/** What was filled in of the first case: enough to show the note, and the flags that it still has. */
const halfDone = (day: string): Partial<CaseRecord> => ({
  before: {
    diagnosis: 'rhegmatogenous',
    recurrent: false,
    macula: 'off',
    maculaOffDays: 3,
    detachmentFromClock: 12.5,
    detachmentToClock: 5,
    posteriorVitreousDetachment: 'complete',
    pvr: { grade: 'none' },
    lens: 'phakic',
    axialLengthMm: 24.3,
    vitreousHaemorrhage: false,
  },
  anaesthesia: {
    kind: 'general',
    nitrousOxideUsed: false,
    antisepsis: 'povidone-iodine',
    blockEye: 'not-applicable',
  },
  breaks: {
    found: [
      {
        kind: 'horseshoe',
        clock: 2,
        quadrant: 'superotemporal',
        extentClockHours: 0.5,
        frontEdgeMm: 11,
        backEdgeMm: 12.5,
        onDetachedRetina: true,
        treatedBy: ['cryo'],
        supportedByElements: [1],
      },
      {
        kind: 'round-hole',
        clock: 4.5,
        quadrant: 'inferotemporal',
        frontEdgeMm: 13.6,
        backEdgeMm: 14.6,
        onDetachedRetina: true,
        treatedBy: ['cryo'],
        supportedByElements: [1],
      },
    ],
    lattice: 'none',
  },
  buckle: {
    peritomy: 'full-circle',
    muscleSlings: ['medial', 'superior', 'lateral', 'inferior'],
    elements: [
      {
        role: 'encircling',
        form: 'band',
        material: 'solid-silicone',
        widthMm: 3.5,
        thicknessMm: 0.75,
        frontEdgeReference: 'insertions',
        frontEdgeMm: 3,
        underMuscles: ['medial', 'superior', 'lateral', 'inferior'],
        fixation: (['superotemporal', 'superonasal', 'inferonasal', 'inferotemporal'] as const).map(
          (quadrant) => ({
            quadrant,
            kind: 'mattress-suture' as const,
            material: 'nylon' as const,
            gauge: '5-0',
          }),
        ),
        closure: { kind: 'sleeve', quadrant: 'superonasal', material: 'silicone', endsMatch: true },
        intention: 'permanent',
        shortenedMm: 5,
        lot: 'D4471',
        expiresOn: `${Number(day.slice(0, 4)) + 3}-08-31`,
      },
    ],
  },
  vitreous: {
    vitrectomy: true,
    ports: 3,
    gauge: '25',
    sclerotomiesMm: 4,
    hyaloid: 'already-detached',
    baseShaved: 'shaved-under-indentation',
    heavyLiquid: 'none',
    membranesPeeled: ['none'],
    retinotomies: 'none',
    lensWork: 'none',
    sclerotomyClosure: 'sutureless',
  },
  drainage: { kind: 'internal', internalThrough: 'break', outcome: 'complete' },
  retinopexy: { treatments: [{ modality: 'cryo', targets: 'all-breaks', endpointFirstWhitening: true }] },
  tamponade: {
    agent: 'SF6',
    mixing: 'diluted',
    concentrationPercent: 24,
    pureMl: 12,
    syringeMl: 50,
    fillPercent: 90,
    exchange: 'fluid-air-gas',
  },
});

const recordOf = (one: Invented): CaseRecord => ({
  version: 1,
  who: {
    patient: {
      familyName: one.familyName,
      givenName: one.givenName,
      dateOfBirth: one.dateOfBirth,
      number: one.number,
      allergies: one.allergies,
    },
    eye: one.eye,
    planned: one.planned,
    referrer: { name: one.referrer, kind: one.referrer.startsWith('Dr') ? 'family-doctor' : 'optometrist' },
    familyDoctor: one.familyDoctor,
  },
});

/** The demonstration's theatre list of a day, YYYY-MM-DD. */
export const demonstrationRecords = (day: string): CaseRecord[] => [
  ...invented.map((one, index): CaseRecord => {
    const record = recordOf(one);
    if (index > 0) return record;
    return {
      ...record,
      ...halfDone(day),
      who: {
        ...record.who,
        consentEye: 'left',
        markedEye: 'left',
        timeOutEye: 'left',
        timeOutAt: `${day}T09:05`,
        urgency: 'urgent',
        performed: ['vitrectomy', 'encircling-band', 'cryotherapy', 'gas'],
        startedAt: `${day}T09:10`,
        surgeon: { name: 'A. Surgeon', role: 'Consultant' },
        assistants: 'none',
        anaesthetist: 'Dr Willa Fennimore',
        theatre: 'Theatre 2',
      },
    };
  }),
  { version: 1, ...nearlyComplete(day) },
];
