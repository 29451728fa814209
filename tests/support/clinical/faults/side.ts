import { apart } from '../globe.ts';
import { buckled, inFamily, listAt, otherEye } from './fault.ts';

const { wrong, missing, inItem } = inFamily('side');
const sideWord = (eye: string | undefined) => (eye === 'right' ? 'left' : 'right');

export const sideFaults = [
  wrong(['consent-for-the-fellow-eye', 'contradiction', 'The consent names the other eye'], (r) => ({
    'who.consentEye': otherEye(r.who?.eye),
  })),
  wrong(['fellow-eye-marked', 'contradiction', 'The mark is over the other eye'], (r) => ({
    'who.markedEye': otherEye(r.who?.eye),
  })),
  wrong(['time-out-read-the-fellow-eye', 'contradiction', 'The time-out read out the other eye'], (r) => ({
    'who.timeOutEye': otherEye(r.who?.eye),
  })),
  wrong(
    ['eye-of-the-note-transposed', 'contradiction', 'The note gives the other eye than every other place'],
    (r) => ({
      'who.eye': otherEye(r.who?.eye),
    }),
  ),
  wrong(['block-in-the-fellow-eye', 'contradiction', 'The block is recorded in the other eye'], (r) =>
    r.anaesthesia?.blockEye === undefined || r.anaesthesia.blockEye === 'not-applicable'
      ? null
      : { 'anaesthesia.blockEye': otherEye(r.who?.eye) },
  ),
  inItem(
    ['drop-for-the-fellow-eye', 'contradiction', 'A drop is prescribed to the other eye'],
    'aftercare.drops',
    (_, r) => ({
      eye: otherEye(r.who?.eye),
    }),
  ),
  inItem(
    ['drug-given-to-the-fellow-eye', 'contradiction', 'A drug is recorded as given to the other eye'],
    'endOfCase.medicines',
    (m, r) => (m.eye === undefined ? null : { eye: otherEye(r.who?.eye) }),
  ),
  inItem(
    ['nasal-for-temporal-break', 'contradiction', 'Nasal and temporal are changed over for a break'],
    'breaks.found',
    (b) => {
      if (
        b.quadrant === undefined ||
        b.clock === undefined ||
        apart(b.clock, 12) < 0.75 ||
        apart(b.clock, 6) < 0.75
      )
        return null;
      return {
        quadrant: b.quadrant.includes('nasal')
          ? b.quadrant.replace('nasal', 'temporal')
          : b.quadrant.replace('temporal', 'nasal'),
      };
    },
  ),
  wrong(
    [
      'remarks-name-the-fellow-eye-as-operated',
      'contradiction',
      'Free text says that the other eye was operated on',
    ],
    (r) => ({
      'endOfCase.remarks': `Uneventful surgery to the ${sideWord(r.who?.eye)} eye.`,
    }),
  ),
  wrong(
    ['finding-written-for-the-fellow-eye', 'contradiction', 'The other findings give the wrong eye'],
    (r) => ({
      'breaks.note': `${r.who?.eye === 'right' ? 'Left' : 'Right'} retina bullous above, the breaks as listed.`,
    }),
  ),
  wrong(['indication-names-the-fellow-eye', 'contradiction', 'The indication gives the wrong eye'], (r) => ({
    'before.indication': `Retinal detachment of the ${sideWord(r.who?.eye)} eye, to be repaired.`,
  })),
  missing(['eye-not-stated', 'omission', 'The eye is not stated'], 'who.eye'),
  missing(['consent-eye-not-stated', 'omission', 'The eye on the consent is not recorded'], 'who.consentEye'),
  missing(['mark-not-stated', 'omission', 'The mark is not recorded'], 'who.markedEye'),
  missing(
    ['time-out-eye-not-stated', 'omission', 'The eye at the time-out is not recorded'],
    'who.timeOutEye',
  ),
  missing(
    ['block-eye-not-stated', 'omission', 'A block without its eye'],
    'anaesthesia.blockEye',
    (r) => r.anaesthesia?.blockEye === r.who?.eye,
  ),
  inItem(['drop-without-eye', 'omission', 'A drop without an eye'], 'aftercare.drops', () => ({
    eye: undefined,
  })),
  wrong(
    [
      'earlier-surgery-on-the-fellow-eye-only',
      'contradiction',
      'A recurrence whose earlier operation is listed for the other eye',
    ],
    (r) => {
      const earlier = listAt(r, 'before.previousOperations');
      const retinal = earlier.findIndex((o) => o.what !== 'cataract' && o.eye === r.who?.eye);
      if (r.before?.recurrent !== true || retinal === -1) return null;
      if (earlier.filter((o) => o.what !== 'cataract' && o.eye === r.who?.eye).length > 1) return null;
      return { [`before.previousOperations.${retinal}.eye`]: otherEye(r.who?.eye) };
    },
  ),
  inItem(
    [
      'fixation-quadrant-of-the-fellow-eye',
      'contradiction',
      'The sutures of a segment lie in quadrants where it is not',
    ],
    'buckle.elements',
    (e, r) => {
      if (!buckled(r) || e.role !== 'segment' || !Array.isArray(e.fixation)) return null;
      const quadrants = new Set(e.fixation.map((f) => f.quadrant));
      if (quadrants.size !== 1) return null;
      const [own] = quadrants;
      const across = own?.includes('nasal')
        ? own.replace('nasal', 'temporal')
        : own?.replace('temporal', 'nasal');
      return { fixation: e.fixation.map((f) => ({ ...f, quadrant: across })) };
    },
  ),
];
