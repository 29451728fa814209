import {
  breaksOf,
  elementsOf,
  gasOf,
  isEncircling,
  oilOf,
  previousOf,
  treatmentsOf,
} from '../checks/facts.ts';
import { labelOf, listWords, numberWords } from '../drafting/words.ts';
import { fieldLabel } from '../record/field-tree.ts';
import { valueAt } from '../record/paths.ts';
import type { CaseRecord } from '../record/schema.ts';
import { type Certainty, type CodeSetName, codeSets } from './code-sets.ts';

/** A fact that a code rests on: where it is recorded, and how that field is called. */
export interface Because {
  field: string;
  words: string;
}

export interface Proposal {
  set: CodeSetName;
  code: string;
  title: string;
  modifiers: string[];
  because: Because[];
  certainty: Certainty;
  /** Not read in the source itself: the coder looks it up before using it. */
  confirm: boolean;
}

export interface Rejection {
  set: CodeSetName;
  code: string;
  why: string;
}

export interface Coding {
  proposed: Proposal[];
  rejected: Rejection[];
  /** What only a person can answer, because the record does not say. */
  questions: string[];
}

const shown = (field: string, value: unknown): string => {
  if (typeof value === 'string') return labelOf(field, value);
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (typeof value === 'number') return numberWords(value);
  if (!Array.isArray(value)) return 'not recorded';
  if (value.every((one) => typeof one === 'string'))
    return listWords(value.map((one) => labelOf(field, one)));
  return `${value.length} recorded`;
};

/** The facts at these fields, in the record's own words. */
const reason = (record: CaseRecord, ...fields: string[]): Because[] =>
  fields.map((field) => ({ field, words: `${fieldLabel(field)}: ${shown(field, valueAt(record, field))}` }));

const entryOf = (set: CodeSetName, stem: string) => codeSets[set].entries[stem];

const propose = (
  set: CodeSetName,
  stem: string,
  code: string,
  modifiers: string[],
  because: Because[],
): Proposal[] => {
  const entry = entryOf(set, stem);
  if (entry === undefined) return [];
  const { title, certainty } = entry;
  return [{ set, code, title, modifiers, because, certainty, confirm: certainty !== 'R' }];
};

type Eye = 'right' | 'left' | undefined;
const sixth = (eye: Eye) => (eye === 'right' ? '1' : eye === 'left' ? '2' : '9');
const fifth = (eye: Eye) => (eye === 'right' ? '1' : eye === 'left' ? '2' : '0');

const diagnosisOf = (record: CaseRecord) => {
  const after = record.endOfCase?.postoperativeDiagnosis;
  return {
    diagnosis: after ?? record.before?.diagnosis,
    field: after === undefined ? 'before.diagnosis' : 'endOfCase.postoperativeDiagnosis',
  };
};

/** Diagnoses: the sixth character tells the side of H33.0 and H33.3, the fifth that of H33.4, H33.2 and H43.1. */
const diagnoses = (record: CaseRecord): Proposal[] => {
  const { diagnosis, field } = diagnosisOf(record);
  const eye = record.who?.eye;
  const found = breaksOf(record).filter(({ kind }) => kind !== 'macular-hole');
  const why = (...more: string[]) => reason(record, field, 'who.eye', ...more);
  const detachment = (stem: string, ...more: string[]) =>
    propose('ICD-10-CM', stem, `${stem}${sixth(eye)}`, [], why(...more));
  const haemorrhage =
    record.before?.vitreousHaemorrhage === true
      ? propose(
          'ICD-10-CM',
          'H43.1',
          `H43.1${fifth(eye)}`,
          [],
          reason(record, 'before.vitreousHaemorrhage', 'who.eye'),
        )
      : [];
  switch (diagnosis) {
    case 'rhegmatogenous': {
      if (record.before?.totalDetachment === true) {
        return [...detachment('H33.05', 'before.totalDetachment'), ...haemorrhage];
      }
      const stem = found.length === 0 ? 'H33.00' : found.length === 1 ? 'H33.01' : 'H33.02';
      return [...detachment(stem, 'breaks.found'), ...haemorrhage];
    }
    case 'giant-tear':
      return [...detachment('H33.03', 'breaks.found'), ...haemorrhage];
    case 'dialysis':
      return [...detachment('H33.04', 'breaks.found'), ...haemorrhage];
    case 'combined':
      return [
        ...detachment(found.length > 1 ? 'H33.02' : found.length === 1 ? 'H33.01' : 'H33.00', 'breaks.found'),
        ...propose('ICD-10-CM', 'H33.4', `H33.4${fifth(eye)}`, [], why()),
        ...haemorrhage,
      ];
    case 'tractional':
      return [...propose('ICD-10-CM', 'H33.4', `H33.4${fifth(eye)}`, [], why()), ...haemorrhage];
    case 'serous':
      return [...propose('ICD-10-CM', 'H33.2', `H33.2${fifth(eye)}`, [], why()), ...haemorrhage];
    case 'break-without-detachment': {
      const [only] = found;
      const stem =
        found.length > 1
          ? 'H33.33'
          : only?.kind === 'horseshoe'
            ? 'H33.31'
            : only?.kind === 'round-hole' || only?.kind === 'operculated'
              ? 'H33.32'
              : 'H33.30';
      return [...detachment(stem, 'breaks.found'), ...haemorrhage];
    }
    default:
      return haemorrhage;
  }
};

const complexGrades = ['C1', 'C2', 'C3', 'D1', 'D2', 'D3', 'CP', 'CA'];

/** What makes a detachment complex for 67113: PVR C-1 or worse, a tear of more than 90°, or traction. */
const complexity = (record: CaseRecord): Because[] => {
  const grade = record.before?.pvr?.grade;
  const giant = breaksOf(record).findIndex(
    ({ kind, extentClockHours }) =>
      kind === 'giant-tear' || (kind !== 'dialysis' && (extentClockHours ?? 0) > 3),
  );
  const { diagnosis, field } = diagnosisOf(record);
  return [
    ...(grade !== undefined && complexGrades.includes(grade) ? reason(record, 'before.pvr.grade') : []),
    ...(giant >= 0 ? reason(record, `breaks.found.${giant}.extentClockHours`) : []),
    ...(diagnosis === 'tractional' || diagnosis === 'combined' ? reason(record, field) : []),
  ];
};

const modifierOf = (eye: Eye): string[] => (eye === 'right' ? ['RT'] : eye === 'left' ? ['LT'] : []);

const procedures = (record: CaseRecord): Pick<Coding, 'proposed' | 'rejected'> => {
  const { diagnosis } = diagnosisOf(record);
  const side = modifierOf(record.who?.eye);
  const proposed: Proposal[] = [];
  const rejected: Rejection[] = [];
  const add = (code: string, because: Because[]) =>
    proposed.push(...propose('CPT', code, code, side, because));
  const reject = (code: string, why: string) => rejected.push({ set: 'CPT', code, why });

  const performed = record.who?.performed ?? [];
  const vitrectomy = record.vitreous?.vitrectomy === true;
  const buckle = elementsOf(record).length > 0;
  const modalities = treatmentsOf(record).map(({ modality }) => modality);
  const laser = modalities.some((one) => one?.includes('laser') === true);
  const cold = modalities.some((one) => one === 'cryo' || one === 'diathermy');
  const gas = gasOf(record) !== undefined;
  const detached =
    diagnosis !== undefined && diagnosis !== 'break-without-detachment' && diagnosis !== 'serous';
  const peeled = record.vitreous?.membranesPeeled?.some((one) => one !== 'none') === true;

  if (performed.includes('element-removal')) {
    const released = previousOf(record).some(({ what }) => what === 'encircling-band');
    add(released ? '67115' : '67120', reason(record, 'who.performed'));
  }
  if (performed.includes('oil-removal') && !detached) add('67121', reason(record, 'who.performed'));

  if (vitrectomy && detached) {
    const complex = complexity(record);
    const basis = reason(record, 'vitreous.vitrectomy');
    if (complex.length > 0 && peeled) {
      add('67113', [...basis, ...reason(record, 'vitreous.membranesPeeled'), ...complex]);
      reject('67108', 'one vitrectomy code an eye: 67113 applies');
    } else {
      add('67108', basis);
      reject(
        '67113',
        complex.length > 0
          ? 'needs membrane peeling recorded'
          : 'needs PVR of grade C-1 or worse, a tear of more than 90° or traction, and membrane peeling',
      );
    }
    if (buckle) reject('67107', 'included in the vitrectomy for detachment');
    if (gas) reject('67110', 'included in the vitrectomy for detachment');
    if (laser) reject('67105', 'included in the vitrectomy for detachment');
    if (cold) reject('67101', 'included in the vitrectomy for detachment');
    reject('67036', 'vitrectomy for detachment is coded by 67108 or 67113 only');
  } else if (vitrectomy) {
    add('67036', reason(record, 'vitreous.vitrectomy'));
  } else if (buckle && detached) {
    add('67107', reason(record, 'buckle.elements'));
    if (cold) reject('67101', 'included in the scleral buckle');
    if (laser) reject('67105', 'included in the scleral buckle');
  } else if (gas && detached) {
    add('67110', reason(record, 'tamponade.agent'));
  } else if (detached) {
    if (laser) add('67105', reason(record, 'retinopexy.treatments'));
    else if (cold) add('67101', reason(record, 'retinopexy.treatments'));
  } else if (diagnosis === 'break-without-detachment') {
    if (laser) add('67145', reason(record, 'retinopexy.treatments'));
    else if (cold) add('67141', reason(record, 'retinopexy.treatments'));
  }
  return { proposed, rejected };
};

const opcs = (record: CaseRecord): Proposal[] => {
  const add = (code: string, field: string) => propose('OPCS-4', code, code, [], reason(record, field));
  const eye = record.who?.eye;
  const laser = treatmentsOf(record).some(({ modality }) => modality?.includes('laser') === true);
  const acts = [
    ...(record.vitreous?.vitrectomy === true ? add('C79.2', 'vitreous.vitrectomy') : []),
    ...(gasOf(record) !== undefined ? add('C79.5', 'tamponade.agent') : []),
    ...(oilOf(record) !== undefined ? add('C79.6', 'tamponade.agent') : []),
    ...(elementsOf(record).length > 0 ? add('C54', 'buckle.elements') : []),
    ...(laser ? add('C81', 'retinopexy.treatments') : []),
  ];
  if (acts.length === 0 || eye === undefined) return acts;
  return [...acts, ...add(eye === 'right' ? 'Z94.2' : 'Z94.3', 'who.eye')];
};

const questions = (record: CaseRecord): string[] => {
  const eye = record.who?.eye;
  const earlier = previousOf(record).filter(
    ({ what }) => what !== 'cataract' && what !== 'refractive-surgery',
  );
  return [
    ...(eye === undefined
      ? ['Which eye was operated on? The side decides the characters and the modifier.']
      : []),
    ...(record.before?.recurrent === true
      ? [
          'Was this an unplanned return within the global period (modifier 78), a planned stage (58), or neither?',
        ]
      : []),
    ...(earlier.some((one) => one.eye !== undefined && one.eye !== eye)
      ? ['Is the fellow eye’s operation within its global period (modifier 79)?']
      : []),
    ...(elementsOf(record).some(isEncircling) && record.vitreous?.vitrectomy === undefined
      ? ['Was a vitrectomy performed? The record does not say.']
      : []),
  ];
};

/** Codes that follow from a record, each with the facts behind it, and those that do not, with why. Proposals, never decisions. */
export const proposeCodes = (record: CaseRecord): Coding => {
  const { proposed, rejected } = procedures(record);
  return {
    proposed: [...diagnoses(record), ...proposed, ...opcs(record)],
    rejected,
    questions: questions(record),
  };
};
