import type { CaseRecord } from '../../../../src/domain/record/schema.ts';
import { isDetachedAt } from '../detachment.ts';
import { apart, equatorMm, quadrantOf, wrap } from '../globe.ts';
import { hasGas, inFamily, listAt } from './fault.ts';

const { wrong, missing, inItem } = inFamily('breaks');

const extentOf = (r: CaseRecord) => ({
  total: r.before?.totalDetachment === true,
  ...(r.before?.detachmentFromClock === undefined ? {} : { from: r.before.detachmentFromClock }),
  ...(r.before?.detachmentToClock === undefined ? {} : { to: r.before.detachmentToClock }),
  quadrants: r.before?.quadrantsDetached ?? 0,
});

/** Clear of a border of quadrants, where two readers may differ. */
const clearOf = (clock: number | undefined, ...borders: number[]) =>
  clock !== undefined && borders.every((border) => apart(border, clock) >= 0.75);

const axial = (r: CaseRecord) => r.before?.axialLengthMm ?? 24;

export const breakFaults = [
  inItem(
    ['clock-mirrored', 'contradiction', 'The clock hour is mirrored; the quadrant is right'],
    'breaks.found',
    (b) => (clearOf(b.clock, 12, 6) ? { clock: wrap(12 - ((b.clock ?? 12) % 12)) } : null),
  ),
  inItem(
    ['clock-upside-down', 'contradiction', 'The clock hour is read upside down, as on a drawing turned over'],
    'breaks.found',
    (b) => (b.clock === undefined || b.clock % 3 === 0 ? null : { clock: wrap(b.clock + 6) }),
  ),
  inItem(
    ['superior-for-inferior', 'contradiction', 'Superior written for inferior, or the other way'],
    'breaks.found',
    (b) =>
      b.quadrant === undefined || !clearOf(b.clock, 3, 9)
        ? null
        : {
            quadrant: b.quadrant.startsWith('supero')
              ? b.quadrant.replace('supero', 'infero')
              : b.quadrant.replace('infero', 'supero'),
          },
  ),
  inItem(
    ['said-detached-where-flat', 'contradiction', 'A break outside the detachment is called detached'],
    'breaks.found',
    (b) => (b.onDetachedRetina === false && b.clock !== undefined ? { onDetachedRetina: true } : null),
  ),
  inItem(
    ['said-flat-where-detached', 'contradiction', 'A break well inside the detachment is called flat'],
    'breaks.found',
    (b, r) => {
      const extent = extentOf(r);
      if (b.onDetachedRetina !== true || b.clock === undefined || !isDetachedAt(extent, b.clock)) return null;
      const deep =
        extent.total ||
        [extent.from, extent.to].every((at) => at !== undefined && apart(at, b.clock ?? 0) >= 0.5);
      return deep ? { onDetachedRetina: false } : null;
    },
  ),
  inItem(
    [
      'break-carried-out-of-the-detachment',
      'contradiction',
      'Clock and quadrant put a detached break in attached retina',
    ],
    'breaks.found',
    (b, r) => {
      const extent = extentOf(r);
      const clock = wrap((b.clock ?? 1) + 6);
      if (b.onDetachedRetina !== true || b.clock === undefined || b.kind !== 'horseshoe') return null;
      if (
        isDetachedAt(extent, clock) ||
        [extent.from, extent.to].some((at) => at === undefined || apart(at, clock) < 1)
      )
        return null;
      return { clock, quadrant: quadrantOf(clock, r.who?.eye ?? 'right') };
    },
  ),
  inItem(
    ['edges-changed-over', 'contradiction', 'Front and back edge are changed over'],
    'breaks.found',
    (b) =>
      b.frontEdgeMm === undefined || b.backEdgeMm === undefined || b.frontEdgeMm === b.backEdgeMm
        ? null
        : { frontEdgeMm: b.backEdgeMm, backEdgeMm: b.frontEdgeMm },
  ),
  inItem(
    ['break-in-front-of-the-ora', 'contradiction', 'A break 3 mm behind the limbus'],
    'breaks.found',
    (b) =>
      b.frontEdgeMm === undefined || b.kind === 'dialysis' ? null : { frontEdgeMm: 3, backEdgeMm: 4.5 },
  ),
  inItem(
    ['break-beyond-the-disc', 'contradiction', 'A break 38 mm behind the limbus'],
    'breaks.found',
    (b, r) =>
      b.backEdgeMm === undefined || axial(r) > 26
        ? null
        : { frontEdgeMm: 36, backEdgeMm: 38, supportedByElements: 'none' },
  ),
  inItem(
    ['zone-does-not-fit-the-distance', 'contradiction', 'Posterior pole for a break in front of the equator'],
    'breaks.found',
    (b) => (b.zone === 'pre-equatorial' && b.backEdgeMm !== undefined ? { zone: 'posterior-pole' } : null),
  ),
  inItem(
    ['behind-the-equator-at-nine', 'contradiction', 'Behind the equator, and 9 to 11 mm behind the limbus'],
    'breaks.found',
    (b, r) =>
      b.zone === 'pre-equatorial' && (b.backEdgeMm ?? 99) <= Math.min(11, equatorMm(axial(r)) - 2)
        ? { zone: 'post-equatorial' }
        : null,
  ),
  inItem(
    ['dialysis-behind-the-equator', 'contradiction', 'A dialysis behind the equator'],
    'breaks.found',
    (b) => (b.kind === 'dialysis' ? { zone: 'post-equatorial' } : null),
  ),
  inItem(
    ['giant-tear-of-one-hour', 'contradiction', 'A giant tear of one clock hour'],
    'breaks.found',
    (b) => (b.kind === 'giant-tear' ? { extentClockHours: 1 } : null),
  ),
  inItem(
    ['horseshoe-of-five-hours', 'contradiction', 'A horseshoe tear of five clock hours is a giant tear'],
    'breaks.found',
    (b) => (b.kind === 'horseshoe' && b.supportedByElements === 'none' ? { extentClockHours: 5 } : null),
  ),
  inItem(
    ['macular-hole-in-the-periphery', 'contradiction', 'A macular hole in front of the equator'],
    'breaks.found',
    (b) => (b.kind === 'macular-hole' ? { zone: 'pre-equatorial' } : null),
  ),
  wrong(
    ['no-break-in-a-rhegmatogenous', 'caution', 'Rhegmatogenous detachment treated, no break recorded'],
    (r) =>
      r.before?.diagnosis === 'rhegmatogenous' && listAt(r, 'breaks.found').length > 0
        ? { 'breaks.found': 'none' }
        : null,
  ),
  missing(['breaks-not-listed', 'omission', 'Nothing said of breaks'], 'breaks.found'),
  inItem(['break-without-kind', 'omission', 'A break without its kind'], 'breaks.found', (b) =>
    b.kind === undefined ? null : { kind: undefined },
  ),
  inItem(['break-without-clock', 'omission', 'A break without its clock hour'], 'breaks.found', (b) =>
    b.clock === undefined ? null : { clock: undefined },
  ),
  inItem(
    ['held-by-an-element-that-is-not-there', 'contradiction', 'Supported by element 4 of one'],
    'breaks.found',
    (b) => (Array.isArray(b.supportedByElements) ? { supportedByElements: [4] } : null),
  ),
  inItem(
    [
      'held-by-an-element-without-a-buckle',
      'contradiction',
      'Supported by an element in an operation without one',
    ],
    'breaks.found',
    (b, r) => (r.buckle?.elements === 'none' && b.clock !== undefined ? { supportedByElements: [1] } : null),
  ),
  inItem(
    ['held-though-far-behind-the-band', 'contradiction', 'Said to be supported, 5 mm behind the back edge'],
    'breaks.found',
    (b, r) => {
      const only = listAt(r, 'buckle.elements');
      if (!Array.isArray(b.supportedByElements) || only.length !== 1 || only[0]?.role !== 'encircling')
        return null;
      if (b.backEdgeMm === undefined || b.frontEdgeMm === undefined) return null;
      const further = (only[0].widthMm ?? 2) + 5;
      return { frontEdgeMm: b.frontEdgeMm + further, backEdgeMm: b.backEdgeMm + further, zone: undefined };
    },
  ),
  inItem(
    ['nothing-holds-the-break', 'omission', 'A detached break left with neither element nor tamponade'],
    'breaks.found',
    (b, r) =>
      Array.isArray(b.supportedByElements) &&
      b.onDetachedRetina === true &&
      !hasGas(r) &&
      r.tamponade?.agent === 'none'
        ? { supportedByElements: 'none' }
        : null,
  ),
  wrong(['one-break-entered-twice', 'caution', 'The same break is entered twice'], (r) => {
    const found = listAt(r, 'breaks.found');
    const [first] = found;
    return first?.clock === undefined || found.length !== 1
      ? null
      : { 'breaks.found': [first, { ...first }] };
  }),
  missing(['lattice-not-stated', 'omission', 'Nothing said of lattice'], 'breaks.lattice'),
];
