import { general, inFamily, vitrectomized } from './fault.ts';

const { wrong, missing, inItem } = inFamily('standards');

export const standardFaults = [
  missing(
    ['complications-not-stated', 'omission', 'Nothing said of complications'],
    'endOfCase.complications',
  ),
  wrong(['complication-without-action', 'omission', 'A complication, not said what was done'], (r) =>
    r.endOfCase?.complications === 'none'
      ? { 'endOfCase.complications': [{ kind: 'choroidal-haemorrhage', detail: 'Temporal, shallow.' }] }
      : null,
  ),
  wrong(['complication-without-kind', 'omission', 'A complication without its kind'], (r) =>
    r.endOfCase?.complications === 'none'
      ? { 'endOfCase.complications': [{ action: 'Pressure raised.' }] }
      : null,
  ),
  wrong(['other-complication-unexplained', 'omission', 'Another complication, without a word'], (r) =>
    r.endOfCase?.complications === 'none'
      ? { 'endOfCase.complications': [{ kind: 'other', action: 'Observed.' }] }
      : null,
  ),
  missing(['blood-loss-not-stated', 'omission', 'Nothing said of blood loss'], 'endOfCase.bloodLoss'),
  wrong(['blood-loss-not-measured-after-all', 'omission', 'Measured, without the measure'], (r) =>
    r.endOfCase?.bloodLoss === 'minimal' ? { 'endOfCase.bloodLoss': 'measured' } : null,
  ),
  wrong(['no-blood-yet-forty-millilitres', 'contradiction', 'No blood loss, and 40 mL'], (r) =>
    r.endOfCase?.bloodLoss === 'none' ? { 'endOfCase.bloodLossMl': 40 } : null,
  ),
  missing(['specimens-not-stated', 'omission', 'Nothing said of specimens'], 'endOfCase.specimens'),
  wrong(['specimen-sent-nowhere', 'omission', 'A specimen without where it went'], (r) =>
    vitrectomized(r) && r.endOfCase?.specimens === 'none'
      ? { 'endOfCase.specimens': [{ what: 'vitreous' }] }
      : null,
  ),
  missing(['counts-not-stated', 'omission', 'Nothing said of the counts'], 'endOfCase.counts'),
  wrong(['counts-discrepant-and-left', 'omission', 'A discrepancy of the counts, nothing done'], (r) =>
    r.endOfCase?.counts === 'correct' ? { 'endOfCase.counts': 'discrepancy' } : null,
  ),
  missing(['anaesthesia-not-stated', 'omission', 'Nothing said of the anaesthesia'], 'anaesthesia.kind'),
  missing(['antisepsis-not-stated', 'omission', 'Nothing said of antisepsis'], 'anaesthesia.antisepsis'),
  wrong(['no-antisepsis', 'caution', 'No antisepsis'], () => ({ 'anaesthesia.antisepsis': 'none' })),
  missing(
    ['thrombosis-not-assessed', 'omission', 'Thrombosis prophylaxis left blank'],
    'endOfCase.thrombosisProphylaxis',
  ),
  missing(['procedures-not-stated', 'omission', 'No procedure'], 'who.performed'),
  wrong(['procedures-empty', 'omission', 'The list of procedures is empty'], () => ({ 'who.performed': [] })),
  missing(['plan-not-stated', 'omission', 'Nothing planned'], 'who.planned'),
  missing(['urgency-not-stated', 'omission', 'Elective or emergency is not said'], 'who.urgency'),
  missing(['patient-not-named', 'omission', 'No family name'], 'who.patient.familyName'),
  missing(['given-name-left-blank', 'omission', 'No given name'], 'who.patient.givenName'),
  missing(['record-number-left-blank', 'omission', 'No record number'], 'who.patient.number'),
  missing(['date-of-birth-left-blank', 'omission', 'No date of birth'], 'who.patient.dateOfBirth'),
  missing(['indication-not-stated', 'omission', 'No indication'], 'before.indication'),
  missing(
    ['postoperative-diagnosis-not-stated', 'omission', 'No diagnosis after surgery'],
    'endOfCase.postoperativeDiagnosis',
  ),
  missing(['tissue-not-stated', 'omission', 'Nothing said of tissue removed'], 'endOfCase.tissue'),
  wrong(['no-tissue-after-vitrectomy', 'contradiction', 'No tissue removed, vitreous cut out'], (r) =>
    vitrectomized(r) ? { 'endOfCase.tissue': ['none'] } : null,
  ),
  wrong(
    ['lens-among-tissue-of-an-eye-that-kept-it', 'contradiction', 'Lens removed as tissue, lens not touched'],
    (r) =>
      r.vitreous?.lensWork === 'none'
        ? { 'endOfCase.tissue': [...(r.endOfCase?.tissue ?? []).filter((t) => t !== 'none'), 'lens'] }
        : null,
  ),
  wrong(
    ['vitreous-among-tissue-without-vitrectomy', 'contradiction', 'Vitreous removed, no vitrectomy'],
    (r) => (r.vitreous?.vitrectomy === false ? { 'endOfCase.tissue': ['vitreous'] } : null),
  ),
  wrong(['plan-changed-without-reason', 'omission', 'Performed is not what was planned, no reason'], (r) =>
    r.who?.whyChanged === undefined && r.who?.performed?.includes('vitrectomy')
      ? { 'who.planned': ['segmental-buckle', 'cryotherapy'] }
      : null,
  ),
  wrong(['reason-lost', 'omission', 'The reason for a changed plan is lost'], (r) =>
    r.who?.whyChanged === undefined ? null : { 'who.whyChanged': undefined },
  ),
  missing(
    ['state-of-the-retina-not-stated', 'omission', 'Nothing said of the retina at the end'],
    'endOfCase.retina',
  ),
  wrong(['where-the-fluid-is', 'omission', 'Fluid left, not said where'], (r) =>
    r.endOfCase?.retina === 'fluid-left' ? { 'endOfCase.fluidLeftWhere': undefined } : null,
  ),
  missing(
    ['breaks-closed-or-not', 'omission', 'Not said whether the breaks are closed'],
    'endOfCase.breaksClosed',
  ),
  wrong(['no-break-closed-yet-flat', 'contradiction', 'Retina flat, no break closed'], (r) =>
    r.endOfCase?.retina === 'flat' && r.endOfCase.breaksClosed === 'all'
      ? { 'endOfCase.breaksClosed': 'none' }
      : null,
  ),
  wrong(['membrane-left-out-of-tissue', 'contradiction', 'Membranes peeled, tissue without membrane'], (r) =>
    r.endOfCase?.tissue?.includes('membrane')
      ? { 'endOfCase.tissue': r.endOfCase.tissue.filter((t) => t !== 'membrane') }
      : null,
  ),
  inItem(['assistant-without-role', 'omission', 'An assistant without a role'], 'who.assistants', () => ({
    role: undefined,
  })),
  missing(['acuity-not-stated', 'omission', 'No acuity before surgery'], 'before.acuity'),
  missing(['theatre-not-stated', 'omission', 'No theatre'], 'who.theatre'),
  wrong(['sedation-under-general', 'caution', 'Sedation under a general anaesthetic'], (r) =>
    general(r) ? { 'anaesthesia.sedation': true } : null,
  ),
];
