import { addDays, dateOf } from '../calendar.ts';
import { inFamily, listAt, vitrectomized } from './fault.ts';

const { wrong, missing, inItem } = inFamily('vitreous');
const drainage = inFamily('drainage');

const peeled = (r: Parameters<typeof vitrectomized>[0]) =>
  r.vitreous?.membranesPeeled?.some((kind) => kind !== 'none') ?? false;
const drop = (r: Parameters<typeof vitrectomized>[0], name: string) => ({
  'who.performed': (r.who?.performed ?? []).filter((p) => p !== name),
  'who.planned': (r.who?.planned ?? []).filter((p) => p !== name),
});
const add = (r: Parameters<typeof vitrectomized>[0], name: string) => ({
  'who.performed': [...(r.who?.performed ?? []), name],
  'who.planned': [...(r.who?.planned ?? []), name],
});

export const vitreousFaults = [
  wrong(['vitrectomy-through-one-port', 'contradiction', 'A vitrectomy through one port'], (r) =>
    vitrectomized(r) ? { 'vitreous.ports': 1 } : null,
  ),
  missing(['ports-not-stated', 'omission', 'Ports are not counted'], 'vitreous.ports', vitrectomized),
  missing(['gauge-not-stated', 'omission', 'Gauge not said'], 'vitreous.gauge', vitrectomized),
  wrong(
    ['ports-without-vitrectomy', 'contradiction', 'Three ports of 25 gauge in a case without vitrectomy'],
    (r) => (r.vitreous?.vitrectomy === false ? { 'vitreous.ports': 3, 'vitreous.gauge': '25' } : null),
  ),
  wrong(['port-in-the-cornea', 'contradiction', 'Sclerotomies 1 mm behind the limbus'], (r) =>
    vitrectomized(r) ? { 'vitreous.sclerotomiesMm': 1 } : null,
  ),
  wrong(['port-through-the-retina', 'contradiction', 'Sclerotomies 8 mm behind the limbus'], (r) =>
    vitrectomized(r) ? { 'vitreous.sclerotomiesMm': 8 } : null,
  ),
  missing(
    ['sclerotomies-not-measured', 'omission', 'Distance of the sclerotomies is left out'],
    'vitreous.sclerotomiesMm',
    vitrectomized,
  ),
  missing(
    ['hyaloid-not-stated', 'omission', 'Nothing said of the hyaloid'],
    'vitreous.hyaloid',
    vitrectomized,
  ),
  wrong(
    ['hyaloid-detached-twice', 'contradiction', 'Vitreous fully attached before, found already detached'],
    (r) =>
      vitrectomized(r) && r.before?.posteriorVitreousDetachment === 'none'
        ? { 'vitreous.hyaloid': 'already-detached' }
        : null,
  ),
  wrong(
    ['detached-hyaloid-left-attached', 'contradiction', 'Vitreous detached before, hyaloid left attached'],
    (r) =>
      vitrectomized(r) && r.before?.posteriorVitreousDetachment === 'complete'
        ? { 'vitreous.hyaloid': 'left-attached' }
        : null,
  ),
  wrong(
    ['vitrectomy-done-not-listed', 'contradiction', 'A vitrectomy was done, not among the procedures'],
    (r) => (vitrectomized(r) ? drop(r, 'vitrectomy') : null),
  ),
  wrong(
    ['vitrectomy-listed-not-done', 'contradiction', 'Vitrectomy among the procedures, recorded as not done'],
    (r) => (r.vitreous?.vitrectomy === false ? add(r, 'vitrectomy') : null),
  ),
  missing(
    ['heavy-liquid-not-stated', 'omission', 'A giant tear; nothing said of heavy liquid'],
    'vitreous.heavyLiquid',
    (r) => vitrectomized(r) && r.before?.diagnosis === 'giant-tear',
  ),
  wrong(
    ['heavy-liquid-forgotten', 'omission', 'Heavy liquid could not be removed, yet no complication'],
    (r) =>
      r.vitreous?.heavyLiquid === 'removed' && r.endOfCase?.complications === 'none'
        ? { 'vitreous.heavyLiquid': 'not-removed' }
        : null,
  ),
  wrong(['heavy-liquid-left-without-a-plan', 'omission', 'Heavy liquid left, no date to remove it'], (r) =>
    r.vitreous?.heavyLiquid === 'left'
      ? { 'vitreous.heavyLiquidRemovalPlannedOn': undefined, 'aftercare.nextOperationOn': undefined }
      : null,
  ),
  wrong(['heavy-liquid-left-for-half-a-year', 'caution', 'Heavy liquid to stay half a year'], (r) =>
    r.vitreous?.heavyLiquid === 'left'
      ? {
          'vitreous.heavyLiquidRemovalPlannedOn': addDays(dateOf(r.who?.endedAt ?? ''), 180),
          'aftercare.nextOperationOn': addDays(dateOf(r.who?.endedAt ?? ''), 180),
        }
      : null,
  ),
  wrong(['heavy-liquid-fills-two-eyes', 'contradiction', '16 mL of heavy liquid in one eye'], (r) =>
    r.vitreous?.heavyLiquidVolumeMl === undefined ? null : { 'vitreous.heavyLiquidVolumeMl': 16 },
  ),
  wrong(
    ['volume-of-a-liquid-not-used', 'contradiction', 'A volume of heavy liquid that was not used'],
    (r) =>
      vitrectomized(r) && r.vitreous?.heavyLiquid === 'none' ? { 'vitreous.heavyLiquidVolumeMl': 3 } : null,
  ),
  wrong(
    ['exchange-for-a-liquid-not-used', 'contradiction', 'Oil exchanged for heavy liquid that was not used'],
    (r) =>
      r.vitreous?.heavyLiquid === 'none' && r.tamponade?.exchange?.endsWith('oil')
        ? { 'tamponade.exchange': 'heavy-liquid-oil' }
        : null,
  ),
  wrong(['peel-listed-not-done', 'contradiction', 'A peel among the procedures, no membrane peeled'], (r) =>
    vitrectomized(r) && !peeled(r) ? add(r, 'membrane-peel') : null,
  ),
  wrong(['peel-done-not-listed', 'contradiction', 'Membranes peeled, no peel among the procedures'], (r) =>
    peeled(r) ? drop(r, 'membrane-peel') : null,
  ),
  wrong(['peel-without-vitrectomy', 'contradiction', 'Membranes peeled without a vitrectomy'], (r) =>
    r.vitreous?.vitrectomy === false ? { 'vitreous.membranesPeeled': ['epiretinal'] } : null,
  ),
  wrong(['none-and-some-membranes', 'contradiction', 'None, and a membrane, peeled'], (r) =>
    peeled(r) ? { 'vitreous.membranesPeeled': ['none', ...(r.vitreous?.membranesPeeled ?? [])] } : null,
  ),
  inItem(
    ['cut-retina-not-treated', 'omission', 'A retinectomy without retinopexy'],
    'vitreous.retinotomies',
    (_cut, r) =>
      listAt(r, 'retinopexy.treatments').some((t) => t.targets === 'circumferential')
        ? null
        : { treatedBy: 'none' },
  ),
  inItem(
    ['retinectomy-without-extent', 'omission', 'A retinectomy without its hours'],
    'vitreous.retinotomies',
    (cut) => (cut.kind === 'drainage' ? null : { fromClock: undefined, toClock: undefined }),
  ),
  wrong(
    ['retinotomy-listed-not-done', 'contradiction', 'Retinotomy among the procedures, none recorded'],
    (r) => (r.vitreous?.retinotomies === 'none' && vitrectomized(r) ? add(r, 'retinotomy') : null),
  ),
  wrong(['phaco-of-an-implant', 'contradiction', 'Phacoemulsification of a pseudophakic eye'], (r) =>
    r.before?.lens === 'pseudophakic' && vitrectomized(r)
      ? { 'vitreous.lensWork': 'phacoemulsification', ...add(r, 'lens-removal') }
      : null,
  ),
  wrong(['lens-taken-from-an-aphake', 'contradiction', 'Lensectomy in an aphakic eye'], (r) =>
    r.before?.lens === 'aphakic' && vitrectomized(r)
      ? { 'vitreous.lensWork': 'lensectomy', ...add(r, 'lens-removal') }
      : null,
  ),
  wrong(
    ['implant-beside-the-lens', 'contradiction', 'An implant in the bag of an eye that kept its lens'],
    (r) =>
      vitrectomized(r) && r.before?.lens === 'phakic' && r.vitreous?.lensWork === 'none'
        ? {
            'vitreous.lensImplant': {
              form: 'one-piece acrylic',
              powerDioptres: 21,
              position: 'bag',
              lot: 'X1',
              expiresOn: addDays(dateOf(r.who?.endedAt ?? ''), 300),
            },
            ...add(r, 'lens-implant'),
          }
        : null,
  ),
  wrong(['lens-removed-implant-not-stated', 'omission', 'Lens taken out; nothing said of an implant'], (r) =>
    r.vitreous?.lensWork === 'phacoemulsification'
      ? { 'vitreous.lensImplant': undefined, ...drop(r, 'lens-implant') }
      : null,
  ),
  wrong(['lens-removal-not-listed', 'contradiction', 'Phacoemulsification not among the procedures'], (r) =>
    r.vitreous?.lensWork === 'phacoemulsification' ? drop(r, 'lens-removal') : null,
  ),
  missing(
    ['closing-of-ports-not-stated', 'omission', 'Nothing said of closing the sclerotomies'],
    'vitreous.sclerotomyClosure',
    vitrectomized,
  ),
  wrong(
    ['touch-of-a-lens-that-is-not-there', 'contradiction', 'Lens touch in an aphakic or pseudophakic eye'],
    (r) =>
      ['pseudophakic', 'aphakic'].includes(r.before?.lens ?? '') && r.endOfCase?.complications === 'none'
        ? { 'endOfCase.complications': [{ kind: 'lens-touch', action: 'Watched.' }] }
        : null,
  ),
  missing(['vitrectomy-or-not', 'omission', 'Not said whether a vitrectomy was done'], 'vitreous.vitrectomy'),
];

export const drainageFaults = [
  drainage.wrong(
    ['external-drainage-listed-not-done', 'contradiction', 'External drainage listed, none recorded'],
    (r) =>
      r.drainage?.kind === 'none' && listAt(r, 'buckle.elements').length > 0
        ? add(r, 'external-drainage')
        : null,
  ),
  drainage.wrong(
    ['external-drainage-done-not-listed', 'contradiction', 'Drained from outside, not among the procedures'],
    (r) => (r.drainage?.kind === 'external' ? drop(r, 'external-drainage') : null),
  ),
  drainage.wrong(
    ['internal-drainage-without-vitrectomy', 'contradiction', 'Drained from inside without vitrectomy'],
    (r) =>
      r.vitreous?.vitrectomy === false && r.drainage?.kind === 'none'
        ? { 'drainage.kind': 'internal', 'drainage.internalThrough': 'break', 'drainage.outcome': 'complete' }
        : null,
  ),
  drainage.wrong(
    ['drained-where-the-retina-is-flat', 'contradiction', 'The puncture lies where the retina is attached'],
    (r) => {
      const { detachmentFromClock: from, detachmentToClock: to } = r.before ?? {};
      if (r.drainage?.kind !== 'external' || from === undefined || to === undefined) return null;
      const span = (to - from + 12) % 12;
      return span > 8
        ? null
        : { 'drainage.clock': Math.round(((((to + (12 - span) / 2 - 1) % 12) + 12) % 12) + 1) % 12 || 12 };
    },
  ),
  drainage.wrong(
    ['through-a-retinotomy-that-was-not-made', 'contradiction', 'Drained through a retinotomy, none made'],
    (r) =>
      r.drainage?.internalThrough === 'break' && r.vitreous?.retinotomies === 'none'
        ? { 'drainage.internalThrough': 'retinotomy' }
        : null,
  ),
  drainage.missing(
    ['drainage-method-not-stated', 'omission', 'How it was drained is not said'],
    'drainage.externalMethod',
  ),
  drainage.missing(['drainage-outcome-not-stated', 'omission', 'What came is not said'], 'drainage.outcome'),
  drainage.wrong(
    ['drainage-place-not-stated', 'omission', 'Where it was drained from outside is not said'],
    (r) => (r.drainage?.kind === 'external' ? { 'drainage.clock': undefined } : null),
  ),
  drainage.missing(['drained-or-not', 'omission', 'Nothing said of drainage'], 'drainage.kind'),
  drainage.wrong(
    ['incarceration-without-complication', 'contradiction', 'Retina caught at the site, complications none'],
    (r) =>
      r.drainage?.kind === 'external' && r.endOfCase?.complications === 'none'
        ? { 'drainage.outcome': 'incarceration' }
        : null,
  ),
  drainage.wrong(
    ['bleeding-without-complication', 'contradiction', 'Bleeding at the site, complications none'],
    (r) =>
      r.drainage?.kind === 'external' && r.endOfCase?.complications === 'none'
        ? { 'drainage.outcome': 'haemorrhage' }
        : null,
  ),
  drainage.wrong(
    ['all-drained-yet-detached', 'contradiction', 'Drained completely, retina still detached'],
    (r) => (r.drainage?.outcome === 'complete' ? { 'endOfCase.retina': 'detached' } : null),
  ),
  drainage.wrong(['fluid-left-yet-flat', 'caution', 'Some fluid left at drainage, retina flat'], (r) =>
    r.drainage?.kind === 'external' && r.drainage.outcome === 'partial'
      ? { 'endOfCase.retina': 'flat', 'endOfCase.fluidLeftWhere': undefined }
      : null,
  ),
  drainage.wrong(
    ['drainage-detail-without-drainage', 'contradiction', 'No drainage, yet a needle and a place'],
    (r) =>
      r.drainage?.kind === 'none'
        ? { 'drainage.externalMethod': 'needle', 'drainage.clock': 8, 'drainage.outcome': 'complete' }
        : null,
  ),
];
