import {
  choice,
  choices,
  clockHour,
  count,
  date,
  group,
  listOrNone,
  orNotApplicable,
  quantity,
  text,
  yesNo,
} from '../fields.ts';

const dye = group('Dye', {
  kind: choice('Dye', {
    triamcinolone: 'triamcinolone',
    'trypan-blue': 'trypan blue',
    'brilliant-blue': 'brilliant blue',
    'indocyanine-green': 'indocyanine green',
  }),
  purpose: text('For'),
});

const retinotomy = group('Retinotomy', {
  kind: choice('Kind', {
    drainage: 'drainage retinotomy',
    relaxing: 'relaxing retinotomy',
    retinectomy: 'retinectomy',
  }),
  fromClock: clockHour('From'),
  toClock: clockHour('To, clockwise'),
  treatedBy: choice('Treated by', { laser: 'laser', cryo: 'cryotherapy', none: 'not treated' }),
});

export const vitreous = group('Vitreous', {
  vitrectomy: yesNo('Vitrectomy performed'),
  ports: orNotApplicable(count('Ports', 6)),
  gauge: orNotApplicable(
    choice('Gauge', { '20': '20 gauge', '23': '23 gauge', '25': '25 gauge', '27': '27 gauge' }),
  ),
  sclerotomiesMm: quantity('Sclerotomies', 'mm behind the limbus', 0, 10),
  hyaloid: choice('Posterior hyaloid', {
    'already-detached': 'already detached',
    induced: 'detachment induced',
    'left-attached': 'left attached',
  }),
  baseShaved: choice('Vitreous base', {
    'shaved-under-indentation': 'shaved under indentation',
    shaved: 'shaved',
    'not-shaved': 'not shaved',
  }),
  dyes: listOrNone('Dyes', 'dye', dye),
  heavyLiquid: choice('Heavy liquid', {
    none: 'not used',
    removed: 'used and removed',
    left: 'left in the eye on purpose',
    'not-removed': 'could not be removed fully',
  }),
  heavyLiquidVolumeMl: quantity('Heavy liquid volume', 'mL', 0, 20),
  heavyLiquidRemovalPlannedOn: date('Heavy liquid to be removed on'),
  membranesPeeled: choices('Membranes peeled', {
    none: 'none',
    epiretinal: 'epiretinal membrane',
    ilm: 'internal limiting membrane',
    preretinal: 'preretinal PVR membranes',
    subretinal: 'subretinal bands',
  }),
  retinotomies: listOrNone('Retinotomies', 'retinotomy', retinotomy),
  lensWork: choice('Lens', {
    none: 'not touched',
    phacoemulsification: 'phacoemulsification',
    lensectomy: 'lensectomy',
    'implant-removed': 'implant removed',
  }),
  lensImplant: orNotApplicable(
    group('Lens implant', {
      form: text('Form and material'),
      powerDioptres: quantity('Power', 'D', -20, 50),
      position: choice('Position', {
        bag: 'in the bag',
        sulcus: 'in the sulcus',
        scleral: 'fixed to the sclera',
        'anterior-chamber': 'in the anterior chamber',
      }),
      lot: text('Lot or serial number'),
      expiresOn: date('Expiry'),
      axialLengthUsedMm: quantity('Axial length used', 'mm', 10, 50),
    }),
  ).meta({ title: 'Lens implant' }),
  sclerotomyClosure: orNotApplicable(
    choice('Sclerotomies', { sutureless: 'sutureless', sutured: 'sutured', 'some-sutured': 'some sutured' }),
  ),
});
