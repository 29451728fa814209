import { buckled, encircles, inFamily } from './fault.ts';

const tension = inFamily('tension');
const closure = inFamily('closure');

export const tensionFaults = [
  tension.inItem(
    ['shortened-by-half-the-eye', 'contradiction', 'Shortened by 35 mm'],
    'buckle.elements',
    (e) => (e.shortenedMm === undefined ? null : { shortenedMm: 35, heightMm: undefined }),
  ),
  tension.inItem(
    ['higher-than-the-shortening-allows', 'contradiction', 'Higher than that shortening can make it'],
    'buckle.elements',
    (e, r) =>
      e.role === 'encircling' && r.buckle?.elements?.length === 1 && (e.shortenedMm ?? 99) <= 8
        ? { heightMm: 4 }
        : null,
  ),
  tension.inItem(
    ['shortening-without-its-point', 'contradiction', 'Shortening ten times too large'],
    'buckle.elements',
    (e) =>
      (e.shortenedMm ?? 0) >= 4 && (e.shortenedMm ?? 0) < 8
        ? { shortenedMm: (e.shortenedMm ?? 0) * 10 }
        : null,
  ),
  tension.inItem(
    ['tension-not-stated', 'omission', 'Neither shortening nor height of a band'],
    'buckle.elements',
    (e) => (e.role === 'encircling' ? { shortenedMm: undefined, heightMm: undefined } : null),
  ),
  tension.inItem(
    ['tied-at-pulsating-pressure', 'caution', 'The band was set at 150 mmHg'],
    'buckle.elements',
    (e) => (e.pressureWhileTensioningMmHg === undefined ? null : { pressureWhileTensioningMmHg: 150 }),
  ),
  tension.inItem(
    ['set-on-a-soft-eye', 'caution', 'The band was set at 4 mmHg, so that it will be too tight'],
    'buckle.elements',
    (e) => (e.pressureWhileTensioningMmHg === undefined ? null : { pressureWhileTensioningMmHg: 4 }),
  ),
  tension.inItem(
    ['infusion-without-vitrectomy', 'contradiction', 'Pressure set by an infusion that was not there'],
    'buckle.elements',
    (e, r) =>
      e.pressureSetBy !== undefined && r.vitreous?.vitrectomy === false
        ? { pressureSetBy: 'infusion' }
        : null,
  ),
  tension.wrong(
    ['disc-pale-and-left', 'omission', 'Disc not perfused, no complication, nothing done'],
    (r) => (r.endOfCase?.complications === 'none' ? { 'endOfCase.discPerfused': false } : null),
  ),
  tension.missing(
    ['disc-not-looked-at', 'omission', 'Nothing said of the disc after a buckle'],
    'endOfCase.discPerfused',
    buckled,
  ),
  tension.wrong(['hard-eye-left', 'caution', '48 mmHg at the end, nothing said'], () => ({
    'endOfCase.pressureMmHg': 48,
  })),
  tension.wrong(['soft-eye-left', 'caution', '2 mmHg at the end, nothing said'], () => ({
    'endOfCase.pressureMmHg': 2,
  })),
  tension.missing(
    ['closing-pressure-not-stated', 'omission', 'No pressure at the end'],
    'endOfCase.pressureMmHg',
  ),
  tension.wrong(
    [
      'retinal-artery-shut-but-disc-perfused',
      'omission',
      'Artery not perfused as complication with nothing done',
    ],
    () => ({
      'endOfCase.complications': [{ kind: 'arterial-occlusion' }],
    }),
  ),
];

export const closureFaults = [
  closure.inItem(['band-twisted', 'caution', 'Cut ends do not match'], 'buckle.elements', (e) =>
    typeof e.closure === 'object' ? { 'closure.endsMatch': false } : null,
  ),
  closure.inItem(
    ['twist-not-checked', 'omission', 'Not said whether the ends match'],
    'buckle.elements',
    (e) => (typeof e.closure === 'object' ? { 'closure.endsMatch': undefined } : null),
  ),
  closure.inItem(
    ['closure-not-stated', 'omission', 'Nothing said of how a band was joined'],
    'buckle.elements',
    (e) => (typeof e.closure === 'object' ? { closure: undefined } : null),
  ),
  closure.inItem(
    ['ring-that-is-never-closed', 'contradiction', 'Joining not applicable to an encircling band'],
    'buckle.elements',
    (e) => (e.role === 'encircling' ? { closure: 'not-applicable' } : null),
  ),
  closure.inItem(
    ['dissolving-knot-for-good', 'contradiction', 'An absorbable knot for a permanent band'],
    'buckle.elements',
    (e) =>
      typeof e.closure === 'object' && e.intention === 'permanent'
        ? { 'closure.kind': 'knot', 'closure.material': 'polyglactin-910' }
        : null,
  ),
  closure.inItem(
    ['intention-changed-to-permanent', 'contradiction', 'A band with an absorbable knot called permanent'],
    'buckle.elements',
    (e, r) =>
      e.intention === 'temporary' && r.aftercare?.elementRemovalInMonths !== undefined
        ? { intention: 'permanent' }
        : null,
  ),
  closure.inItem(['metal-sleeve', 'contradiction', 'A silicone sleeve of metal'], 'buckle.elements', (e) =>
    typeof e.closure === 'object' && e.closure.kind === 'sleeve' ? { 'closure.material': 'metal' } : null,
  ),
  closure.inItem(['silicone-clip', 'contradiction', 'A knot of metal'], 'buckle.elements', (e) =>
    typeof e.closure === 'object' && e.closure.kind === 'knot' ? { 'closure.material': 'metal' } : null,
  ),
  closure.inItem(
    [
      'temporary-behind-a-lasting-sleeve',
      'omission',
      'Called temporary, joined by a sleeve, no removal planned',
    ],
    'buckle.elements',
    (e, r) =>
      typeof e.closure === 'object' &&
      e.closure.kind === 'sleeve' &&
      r.aftercare?.elementRemovalInMonths === undefined
        ? { intention: 'temporary' }
        : null,
  ),
  closure.inItem(
    ['join-without-quadrant', 'omission', 'Where the ends were joined is not said'],
    'buckle.elements',
    (e) => (typeof e.closure === 'object' ? { 'closure.quadrant': undefined } : null),
  ),
  closure.inItem(
    ['intention-not-stated', 'omission', 'Permanent or temporary is not said'],
    'buckle.elements',
    (e, r) => (e.role === 'encircling' && encircles(r) ? { intention: undefined } : null),
  ),
  closure.inItem(
    ['segment-with-a-join', 'contradiction', 'A segment whose ends are joined'],
    'buckle.elements',
    (e) =>
      e.role === 'segment'
        ? { closure: { kind: 'sleeve', quadrant: 'superonasal', material: 'silicone', endsMatch: true } }
        : null,
  ),
  closure.inItem(['knot-without-material', 'omission', 'A knot of nothing'], 'buckle.elements', (e) =>
    typeof e.closure === 'object' && e.closure.kind === 'knot' ? { 'closure.material': undefined } : null,
  ),
  closure.wrong(['temporary-without-release-date', 'omission', 'Temporary, not said for how long'], (r) =>
    r.aftercare?.elementRemovalInMonths === undefined
      ? null
      : { 'aftercare.elementRemovalInMonths': undefined },
  ),
  closure.wrong(
    ['release-long-after-the-knot-has-gone', 'caution', 'A knot that holds for weeks, release in two years'],
    (r) =>
      r.aftercare?.elementRemovalInMonths === undefined ? null : { 'aftercare.elementRemovalInMonths': 24 },
  ),
];
