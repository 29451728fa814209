import { apart, wrap } from '../globe.ts';
import { buckled, encircles, inFamily } from './fault.ts';

const { wrong, missing, inItem } = inFamily('buckle');

const named = (r: Parameters<typeof buckled>[0], name: string) =>
  (r.who?.performed ?? []).some((p) => p === name);
const without = (r: Parameters<typeof buckled>[0], name: string) => ({
  'who.performed': (r.who?.performed ?? []).filter((p) => p !== name),
  'who.planned': (r.who?.planned ?? []).filter((p) => p !== name),
});

export const buckleFaults = [
  inItem(
    ['band-misses-a-muscle', 'contradiction', 'An encircling band under three of the four muscles'],
    'buckle.elements',
    (e) => (e.role === 'encircling' ? { underMuscles: ['medial', 'superior', 'inferior'] } : null),
  ),
  inItem(
    ['width-without-its-point', 'contradiction', 'Width written without the decimal point'],
    'buckle.elements',
    (e) => (e.widthMm === 2.5 ? { widthMm: 25 } : null),
  ),
  inItem(
    ['thickness-without-its-point', 'contradiction', 'Thickness ten times too large'],
    'buckle.elements',
    (e) => (e.thicknessMm === 0.75 ? { thicknessMm: 7.5 } : null),
  ),
  inItem(
    [
      'reference-changed-to-limbus',
      'contradiction',
      'Two millimetres behind the limbus for behind the insertions',
    ],
    'buckle.elements',
    (e) =>
      e.role === 'encircling' && e.frontEdgeReference === 'insertions'
        ? { frontEdgeReference: 'limbus' }
        : null,
  ),
  inItem(
    [
      'reference-changed-to-insertions',
      'contradiction',
      'A distance from the limbus called a distance from the insertions',
    ],
    'buckle.elements',
    (e) =>
      e.frontEdgeReference === 'limbus' && (e.frontEdgeMm ?? 0) >= 9
        ? { frontEdgeReference: 'insertions' }
        : null,
  ),
  inItem(
    ['no-reference-for-the-front-edge', 'omission', 'A front edge measured from nowhere'],
    'buckle.elements',
    (e) => (e.frontEdgeReference === undefined ? null : { frontEdgeReference: undefined }),
  ),
  inItem(['front-edge-left-out', 'omission', 'Where the element lies is not said'], 'buckle.elements', (e) =>
    e.frontEdgeMm === undefined
      ? null
      : { frontEdgeMm: undefined, frontEdgeReference: undefined, frontEdgeByQuadrantMm: undefined },
  ),
  inItem(
    ['one-quadrant-not-sutured', 'caution', 'A band fixed in three quadrants'],
    'buckle.elements',
    (e) =>
      e.role === 'encircling' && Array.isArray(e.fixation) && e.fixation.length === 4
        ? { fixation: e.fixation.slice(1) }
        : null,
  ),
  inItem(
    [
      'quadrant-sutured-twice-another-missed',
      'contradiction',
      'One quadrant is written twice for the four of a band',
    ],
    'buckle.elements',
    (e) => {
      if (e.role !== 'encircling' || !Array.isArray(e.fixation) || e.fixation.length !== 4) return null;
      return {
        fixation: e.fixation.map((f, at) =>
          at === 1
            ? { ...f, quadrant: e.fixation?.[0] instanceof Object ? e.fixation[0].quadrant : f.quadrant }
            : f,
        ),
      };
    },
  ),
  inItem(['band-not-fixed', 'caution', 'An element held by nothing'], 'buckle.elements', (e) =>
    Array.isArray(e.fixation) ? { fixation: 'none' } : null,
  ),
  inItem(
    ['fixation-not-stated', 'omission', 'Nothing said of how the element is fixed'],
    'buckle.elements',
    (e) => (e.fixation === undefined ? null : { fixation: undefined }),
  ),
  inItem(
    ['bite-narrower-than-the-element', 'contradiction', 'Mattress sutures narrower than what they hold'],
    'buckle.elements',
    (e) =>
      Array.isArray(e.fixation) && e.fixation[0]?.kind === 'mattress-suture' && (e.widthMm ?? 0) >= 3.5
        ? { fixation: e.fixation.map((f) => ({ ...f, biteMm: 1.5 })) }
        : null,
  ),
  inItem(
    ['tunnel-narrower-than-the-band', 'contradiction', 'A scleral tunnel too narrow for the band'],
    'buckle.elements',
    (e) =>
      Array.isArray(e.fixation) && e.fixation[0]?.kind === 'scleral-tunnel'
        ? { fixation: e.fixation.map((f) => ({ ...f, biteMm: 1 })) }
        : null,
  ),
  inItem(
    ['suture-that-dissolves-holds-for-good', 'caution', 'Absorbable fixation of a permanent element'],
    'buckle.elements',
    (e) =>
      e.intention === 'permanent' && Array.isArray(e.fixation) && e.fixation[0]?.kind === 'mattress-suture'
        ? { fixation: e.fixation.map((f) => ({ ...f, material: 'polyglactin-910' })) }
        : null,
  ),
  inItem(['suture-without-material', 'omission', 'A mattress suture of nothing'], 'buckle.elements', (e) =>
    Array.isArray(e.fixation) && e.fixation[0]?.kind === 'mattress-suture'
      ? { fixation: e.fixation.map((f) => ({ ...f, material: undefined })) }
      : null,
  ),
  inItem(
    ['sponge-of-solid-silicone', 'contradiction', 'A sponge of solid silicone'],
    'buckle.elements',
    (e) => (e.form?.includes('sponge') ? { material: 'solid-silicone' } : null),
  ),
  inItem(['tyre-of-sponge', 'contradiction', 'A tyre or a band of sponge'], 'buckle.elements', (e) =>
    e.form === 'tyre' || e.form === 'band' ? { material: 'silicone-sponge' } : null,
  ),
  inItem(
    ['round-sponge-not-round', 'contradiction', 'A round sponge with two different diameters'],
    'buckle.elements',
    (e) => (e.form === 'round-sponge' ? { thicknessMm: (e.widthMm ?? 4) / 4 } : null),
  ),
  inItem(
    ['segment-the-long-way-round', 'caution', 'From and to of a segment changed over'],
    'buckle.elements',
    (e) =>
      e.role === 'segment' && e.fromClock !== undefined && e.toClock !== undefined
        ? { fromClock: e.toClock, toClock: e.fromClock }
        : null,
  ),
  inItem(
    [
      'segment-on-the-far-side',
      'contradiction',
      'A segment on the side away from the break it is said to hold',
    ],
    'buckle.elements',
    (e) =>
      e.role === 'segment' && e.fromClock !== undefined && e.toClock !== undefined
        ? { fromClock: wrap(e.fromClock + 6), toClock: wrap(e.toClock + 6) }
        : null,
  ),
  inItem(
    ['segment-without-hours', 'omission', 'A segment that runs from nowhere to nowhere'],
    'buckle.elements',
    (e) => (e.role === 'segment' ? { fromClock: undefined, toClock: undefined } : null),
  ),
  inItem(
    ['radial-without-meridian', 'omission', 'A radial element without its meridian'],
    'buckle.elements',
    (e) => (e.meridianClock === undefined ? null : { meridianClock: undefined }),
  ),
  inItem(
    [
      'radial-beside-the-break',
      'contradiction',
      'A radial element three hours from the break it is said to hold',
    ],
    'buckle.elements',
    (e) => (e.meridianClock === undefined ? null : { meridianClock: wrap(e.meridianClock + 3) }),
  ),
  inItem(
    [
      'element-pushed-too-far-back',
      'contradiction',
      'The front edge lies behind the break that the element is said to hold',
    ],
    'buckle.elements',
    (e, r) =>
      Array.isArray(r.breaks?.found) &&
      r.breaks.found.some((b) => Array.isArray(b.supportedByElements)) &&
      (e.role === 'segment' || e.role === 'encircling') &&
      r.buckle?.elements?.length === 1
        ? { frontEdgeMm: (e.frontEdgeMm ?? 3) + 7, frontEdgeByQuadrantMm: undefined }
        : null,
  ),
  inItem(
    ['band-too-short-for-the-eye', 'contradiction', 'A band of 40 mm round the whole eye'],
    'buckle.elements',
    (e) => (e.role === 'encircling' ? { lengthMm: 40 } : null),
  ),
  inItem(
    ['band-in-centimetres', 'contradiction', 'Length of the band in centimetres'],
    'buckle.elements',
    (e) =>
      e.role === 'encircling' && e.lengthMm !== undefined ? { lengthMm: Math.round(e.lengthMm) / 10 } : null,
  ),
  inItem(
    ['implant-under-no-band', 'contradiction', 'An implant under the band and no band'],
    'buckle.elements',
    (e, r) => (e.role === 'meridional' && !encircles(r) ? { role: 'under-band' } : null),
  ),
  wrong(
    ['buckle-without-opening-the-conjunctiva', 'contradiction', 'Elements sewn on, conjunctiva not opened'],
    (r) => (buckled(r) ? { 'buckle.peritomy': 'none' } : null),
  ),
  wrong(['band-through-a-limited-opening', 'caution', 'All round through a limited opening'], (r) =>
    encircles(r) ? { 'buckle.peritomy': 'limited' } : null,
  ),
  missing(
    ['opening-not-stated', 'omission', 'Nothing said of the conjunctival opening'],
    'buckle.peritomy',
    buckled,
  ),
  wrong(['conjunctiva-opened-never-closed', 'contradiction', 'Opened, closure not applicable'], (r) =>
    buckled(r) ? { 'buckle.conjunctivalClosure': 'not-applicable' } : null,
  ),
  missing(
    ['conjunctival-closure-not-stated', 'omission', 'Nothing said of closing the conjunctiva'],
    'buckle.conjunctivalClosure',
    buckled,
  ),
  wrong(['no-muscle-slung-for-a-band', 'caution', 'A band passed under four muscles, none slung'], (r) =>
    encircles(r) ? { 'buckle.muscleSlings': 'none' } : null,
  ),
  wrong(
    ['band-performed-none-listed', 'contradiction', 'A band among the procedures, no element listed'],
    (r) =>
      encircles(r) && r.breaks?.found === 'none'
        ? { 'buckle.elements': 'none' }
        : r.who?.performed?.includes('vitrectomy') && r.buckle?.elements === 'none'
          ? {
              'who.performed': [...r.who.performed, 'encircling-band'],
              'who.planned': [...(r.who.planned ?? []), 'encircling-band'],
            }
          : null,
  ),
  wrong(
    ['band-listed-not-performed', 'contradiction', 'A band is on the eye, not among the procedures'],
    (r) => (encircles(r) && named(r, 'encircling-band') ? without(r, 'encircling-band') : null),
  ),
  wrong(
    ['segment-listed-not-performed', 'contradiction', 'A segment is on the eye, not among the procedures'],
    (r) => (named(r, 'segmental-buckle') ? without(r, 'segmental-buckle') : null),
  ),
  missing(
    ['buckle-stage-left-blank', 'omission', 'Buckle performed, elements left blank'],
    'buckle.elements',
    buckled,
  ),
  inItem(
    [
      'suture-over-attached-retina-called-detached',
      'caution',
      'A bite said to lie over detached retina where the retina is flat',
    ],
    'buckle.elements',
    (e, r) => {
      const { detachmentFromClock: from, detachmentToClock: to } = r.before ?? {};
      if (
        e.role !== 'encircling' ||
        from === undefined ||
        to === undefined ||
        r.before?.quadrantsDetached !== 1
      )
        return null;
      if (!Array.isArray(e.fixation)) return null;
      return apart(from, to) > 3 || e.fixation.every((f) => f.overDetachedRetina)
        ? null
        : { fixation: e.fixation.map((f) => ({ ...f, overDetachedRetina: true })) };
    },
  ),
  inItem(
    [
      'quadrant-edge-in-front-of-the-muscles',
      'contradiction',
      'One quadrant of the band lies 14 mm behind the insertions',
    ],
    'buckle.elements',
    (e) =>
      e.role === 'encircling' && e.frontEdgeReference === 'insertions'
        ? { frontEdgeByQuadrantMm: { superonasal: 14 } }
        : null,
  ),
];
