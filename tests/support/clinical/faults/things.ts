import { addDays, dateOf } from '../calendar.ts';
import { insertionMm } from '../globe.ts';
import { type buckled, encircles, hasLongGas, hasOil, inFamily, listAt } from './fault.ts';

const implants = inFamily('implants');
const medicines = inFamily('medicines');
const refraction = inFamily('refraction');
type Subject = Parameters<typeof buckled>[0];

const allergy = (substance: string) => ({
  'who.patient.allergies': [{ substance, reaction: 'anaphylaxis' }],
});
const drugGiven = (r: Subject, drug: string) => listAt(r, 'endOfCase.medicines').some((m) => m.drug === drug);
const hasLens = (r: Subject) => typeof r.vitreous?.lensImplant === 'object';

export const implantFaults = [
  implants.inItem(
    ['element-without-lot', 'omission', 'An element without its lot'],
    'buckle.elements',
    () => ({ lot: undefined }),
  ),
  implants.inItem(
    ['element-without-number', 'omission', 'An element without its catalogue number'],
    'buckle.elements',
    () => ({ catalogueNumber: undefined }),
  ),
  implants.inItem(
    ['element-without-expiry', 'omission', 'An element without its expiry'],
    'buckle.elements',
    () => ({ expiresOn: undefined }),
  ),
  implants.inItem(
    ['element-out-of-date', 'contradiction', 'An expired element'],
    'buckle.elements',
    (_, r) => ({ expiresOn: addDays(dateOf(r.who?.startedAt ?? ''), -45) }),
  ),
  implants.inItem(
    ['element-without-width', 'omission', 'An element without its width'],
    'buckle.elements',
    () => ({ widthMm: undefined }),
  ),
  implants.inItem(
    ['element-without-thickness', 'omission', 'An element without its thickness'],
    'buckle.elements',
    () => ({ thicknessMm: undefined }),
  ),
  implants.inItem(
    ['element-without-material', 'omission', 'An element without its material'],
    'buckle.elements',
    () => ({ material: undefined }),
  ),
  implants.inItem(
    ['element-without-form', 'omission', 'An element without its form'],
    'buckle.elements',
    () => ({ form: undefined }),
  ),
  implants.inItem(
    ['element-without-role', 'omission', 'An element without its role'],
    'buckle.elements',
    () => ({ role: undefined }),
  ),
  implants.wrong(['lens-without-lot', 'omission', 'A lens implant without its lot'], (r) =>
    hasLens(r) ? { 'vitreous.lensImplant.lot': undefined } : null,
  ),
  implants.wrong(['lens-without-power', 'omission', 'A lens implant without its power'], (r) =>
    hasLens(r) ? { 'vitreous.lensImplant.powerDioptres': undefined } : null,
  ),
  implants.wrong(['lens-without-position', 'omission', 'A lens implant without its position'], (r) =>
    hasLens(r) ? { 'vitreous.lensImplant.position': undefined } : null,
  ),
  implants.wrong(['lens-out-of-date', 'contradiction', 'An expired lens'], (r) =>
    hasLens(r) ? { 'vitreous.lensImplant.expiresOn': addDays(dateOf(r.who?.startedAt ?? ''), -45) } : null,
  ),
  implants.wrong(
    ['lens-implant-not-listed', 'contradiction', 'A lens implant, not among the procedures'],
    (r) =>
      hasLens(r)
        ? {
            'who.performed': (r.who?.performed ?? []).filter((p) => p !== 'lens-implant'),
            'who.planned': (r.who?.planned ?? []).filter((p) => p !== 'lens-implant'),
          }
        : null,
  ),
  implants.missing(['gas-without-lot', 'omission', 'A gas without its lot'], 'tamponade.lot', hasLongGas),
  implants.missing(['oil-without-lot', 'omission', 'Oil without its lot'], 'tamponade.lot', hasOil),
  implants.missing(
    ['gas-without-expiry', 'omission', 'A gas without its expiry'],
    'tamponade.expiresOn',
    hasLongGas,
  ),
];

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

export const refractionFaults = [
  refraction.wrong(
    ['length-with-figures-changed-over', 'caution', 'Axial length with figures changed over'],
    (r) =>
      (r.before?.axialLengthMm ?? 0) >= 23.9 && (r.before?.axialLengthMm ?? 0) < 25
        ? { 'before.axialLengthMm': 42 }
        : null,
  ),
  refraction.wrong(['length-of-a-mouse', 'caution', 'Axial length 12 mm'], () => ({
    'before.axialLengthMm': 12,
  })),
  refraction.wrong(
    ['lens-with-another-length', 'contradiction', 'The lens was calculated with another axial length'],
    (r) =>
      hasLens(r) ? { 'vitreous.lensImplant.axialLengthUsedMm': (r.before?.axialLengthMm ?? 24) - 2.1 } : null,
  ),
  refraction.wrong(
    ['lens-power-without-its-point', 'contradiction', 'Lens power without its decimal point'],
    (r) =>
      hasLens(r) && Math.abs(r.before?.axialLengthMm ?? 0) < 25
        ? { 'vitreous.lensImplant.powerDioptres': 2 }
        : null,
  ),
  refraction.wrong(
    [
      'eye-measured-before-the-earlier-band',
      'caution',
      'The length was measured before an earlier encircling band',
    ],
    (r) => {
      const band = listAt(r, 'before.previousOperations').find(
        (o) => o.what === 'encircling-band' && o.eye === r.who?.eye,
      );
      return band?.on === undefined ? null : { 'before.axialLengthMeasuredOn': addDays(band.on, -60) };
    },
  ),
  refraction.wrong(['cornea-of-sixty-five', 'caution', 'Keratometry 65 D'], () => ({
    'before.keratometryDioptres': 65,
  })),
  refraction.wrong(['far-sighted-long-eye', 'caution', 'Plus ten in a phakic eye of 28 mm'], (r) =>
    r.before?.lens === 'phakic' && (r.before.axialLengthMm ?? 0) > 27.5
      ? { 'before.sphericalEquivalentDioptres': 10 }
      : null,
  ),
  refraction.wrong(['sign-of-the-refraction', 'caution', 'Minus ten in a phakic eye of 21 mm'], (r) =>
    r.before?.lens === 'phakic' && (r.before.axialLengthMm ?? 99) < 22
      ? { 'before.sphericalEquivalentDioptres': -10 }
      : null,
  ),
  refraction.wrong(
    ['wide-band-in-a-small-eye', 'caution', 'A broad element in a small hyperopic eye'],
    (r) => {
      const [first] = listAt(r, 'buckle.elements');
      if (first?.role !== 'encircling' || !encircles(r)) return null;
      return {
        'before.axialLengthMm': 20.4,
        'before.sphericalEquivalentDioptres': 6,
        'buckle.elements.0.widthMm': 7,
        'buckle.elements.0.form': 'tyre',
        'buckle.elements.0.thicknessMm': 2.75,
        'buckle.elements.0.lengthMm': undefined,
        ...(Array.isArray(first.fixation)
          ? {
              'buckle.elements.0.fixation': first.fixation.map((f) => ({
                ...f,
                biteMm: f.kind === 'scleral-tunnel' ? 7.5 : 9,
              })),
            }
          : {}),
        'buckle.elements.0.frontEdgeMm':
          first.frontEdgeReference === 'limbus' ? insertionMm(12, 'right') + 2 : 2,
      };
    },
  ),
  refraction.missing(
    ['change-of-glasses-left-blank', 'omission', 'An encircling band; the change of glasses is left blank'],
    'aftercare.refractiveChangeTold',
    encircles,
  ),
];
