import type { CaseRecord } from '../../../../src/domain/record/schema.ts';
import { inFamily, listAt } from './fault.ts';

const medicines = inFamily('medicines');
const allergy = (substance: string) => ({
  'who.patient.allergies': [{ substance, reaction: 'anaphylaxis' }],
});
const drugGiven = (r: CaseRecord, drug: string) =>
  listAt(r, 'endOfCase.medicines').some((m) => m.drug === drug);

export const medicineFaults = [
  medicines.wrong(
    ['given-what-they-are-allergic-to', 'contradiction', 'A drug given to a patient allergic to it'],
    (r) => {
      const given = listAt(r, 'endOfCase.medicines').map((m) => m.drug);
      return given[0] === undefined ? null : allergy(given[0]);
    },
  ),
  medicines.wrong(
    [
      'prescribed-what-they-are-allergic-to',
      'contradiction',
      'A drop prescribed to a patient allergic to it',
    ],
    (r) => {
      const drug = listAt(r, 'aftercare.drops')[0]?.drug;
      return drug === undefined || drugGiven(r, drug) ? null : allergy(drug);
    },
  ),
  medicines.wrong(
    ['tablet-they-are-allergic-to', 'contradiction', 'A tablet prescribed to a patient allergic to it'],
    (r) => {
      const drug = listAt(r, 'aftercare.tablets')[0]?.drug;
      return drug === undefined || drugGiven(r, drug) ? null : allergy(drug);
    },
  ),
  medicines.wrong(
    ['iodine-on-an-allergic-skin', 'contradiction', 'Povidone-iodine in a patient allergic to iodine'],
    (r) => (r.anaesthesia?.antisepsis === 'povidone-iodine' ? allergy('iodine') : null),
  ),
  medicines.wrong(
    [
      'sulfonamide-allergy-and-acetazolamide',
      'caution',
      'Acetazolamide in a patient allergic to sulfonamides',
    ],
    (r) =>
      drugGiven(r, 'acetazolamide') || listAt(r, 'aftercare.tablets').some((t) => t.drug === 'acetazolamide')
        ? allergy('sulfonamides')
        : null,
  ),
  medicines.wrong(
    [
      'penicillin-allergy-and-cefuroxime',
      'caution',
      'Cefuroxime in a patient with anaphylaxis to penicillin',
    ],
    (r) => (drugGiven(r, 'cefuroxime') ? allergy('penicillin') : null),
  ),
  medicines.wrong(
    ['local-they-are-allergic-to', 'contradiction', 'Lidocaine block in a patient allergic to lidocaine'],
    (r) =>
      listAt(r, 'anaesthesia.agents').some((a) => a.drug === 'lidocaine') ? allergy('lidocaine') : null,
  ),
  medicines.missing(
    ['allergies-not-stated', 'omission', 'Nothing said of allergies'],
    'who.patient.allergies',
  ),
  medicines.inItem(
    ['drug-without-dose', 'omission', 'A drug without its dose'],
    'endOfCase.medicines',
    () => ({ dose: undefined }),
  ),
  medicines.inItem(
    ['drug-without-route', 'omission', 'A drug without its route'],
    'endOfCase.medicines',
    () => ({ route: undefined }),
  ),
  medicines.inItem(
    ['drug-without-eye', 'omission', 'An injection at the eye without its eye'],
    'endOfCase.medicines',
    (m) => (m.route === 'subconjunctival' ? { eye: undefined } : null),
  ),
  medicines.inItem(
    ['drop-without-times', 'omission', 'A drop without its times a day'],
    'aftercare.drops',
    () => ({ timesADay: undefined }),
  ),
  medicines.inItem(
    ['drop-without-weeks', 'omission', 'A drop without its course'],
    'aftercare.drops',
    () => ({ weeks: undefined }),
  ),
  medicines.inItem(['drop-without-name', 'omission', 'A drop without its drug'], 'aftercare.drops', () => ({
    drug: undefined,
  })),
  medicines.missing(
    ['medicines-left-blank', 'omission', 'Nothing said of medicines given'],
    'endOfCase.medicines',
  ),
  medicines.missing(
    ['anticoagulants-left-blank', 'omission', 'Nothing said of anticoagulants'],
    'before.anticoagulants',
  ),
  medicines.inItem(
    ['anticoagulant-stopped-or-not', 'omission', 'An anticoagulant, not said whether stopped'],
    'before.anticoagulants',
    () => ({ action: undefined }),
  ),
  medicines.wrong(
    ['warfarin-and-a-sharp-needle', 'caution', 'A retrobulbar block with warfarin continued'],
    (r) =>
      r.anaesthesia?.kind === 'retrobulbar' || r.anaesthesia?.kind === 'peribulbar'
        ? {
            'before.anticoagulants': [{ drug: 'warfarin', action: 'continued' }],
            'anaesthesia.kind': 'retrobulbar',
          }
        : null,
  ),
  medicines.inItem(
    ['thirty-millilitres-of-block', 'contradiction', 'A block of 30 mL'],
    'anaesthesia.agents',
    (a) => ((a.volumeMl ?? 0) === 3 ? { volumeMl: 30 } : null),
  ),
  medicines.inItem(['lidocaine-at-twenty', 'contradiction', 'Lidocaine at 20%'], 'anaesthesia.agents', (a) =>
    a.drug === 'lidocaine' ? { concentrationPercent: 20 } : null,
  ),
  medicines.wrong(['block-without-agent', 'omission', 'A block and no agent'], (r) =>
    r.anaesthesia?.kind === 'sub-tenon' || r.anaesthesia?.kind === 'peribulbar'
      ? { 'anaesthesia.agents': 'none' }
      : null,
  ),
  medicines.inItem(
    ['one-drop-twice', 'caution', 'The same drop is prescribed twice'],
    'aftercare.drops',
    (_drop, r, _random, index) => {
      const [first] = listAt(r, 'aftercare.drops');
      return index === 1 ? { drug: first?.drug, strength: first?.strength } : null;
    },
  ),
];
