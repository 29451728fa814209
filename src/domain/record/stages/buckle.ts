import { z } from 'zod';
import {
  choice,
  choices,
  clockHour,
  date,
  group,
  listOrNone,
  orNotApplicable,
  quadrants,
  quantity,
  text,
  yesNo,
} from '../fields.ts';

export const sutureMaterials = {
  nylon: 'nylon',
  polyester: 'polyester',
  polypropylene: 'polypropylene',
  'polyglactin-910': 'polyglactin 910',
  polydioxanone: 'polydioxanone',
} as const;

export const recti = {
  medial: 'medial rectus',
  superior: 'superior rectus',
  lateral: 'lateral rectus',
  inferior: 'inferior rectus',
} as const;

const fixation = group('Fixation', {
  quadrant: choice('Quadrant', quadrants),
  kind: choice('Kind', { 'mattress-suture': 'mattress suture', 'scleral-tunnel': 'scleral tunnel' }),
  material: orNotApplicable(choice('Material', sutureMaterials)),
  gauge: orNotApplicable(text('Suture size')),
  biteMm: quantity('Bite', 'mm', 0, 30),
  overDetachedRetina: yesNo('Over detached retina'),
});

const closure = group('Ends', {
  kind: choice('Joined by', {
    sleeve: 'silicone sleeve',
    clip: 'clip',
    suture: 'suture',
    knot: 'knot',
  }),
  quadrant: choice('Where', quadrants),
  material: orNotApplicable(choice('Material', { ...sutureMaterials, silicone: 'silicone', metal: 'metal' })),
  endsMatch: yesNo('Cut ends match: not twisted'),
});

export const element = group('Element', {
  role: choice('Role', {
    encircling: 'encircling band',
    segment: 'circumferential segment',
    meridional: 'meridional or radial element',
    'under-band': 'implant under the band',
  }),
  form: choice('Form', {
    band: 'band',
    strip: 'strip',
    tyre: 'tyre',
    'round-sponge': 'round sponge',
    'oval-sponge': 'oval sponge',
    wedge: 'wedge',
  }),
  material: choice('Material', { 'solid-silicone': 'solid silicone', 'silicone-sponge': 'silicone sponge' }),
  widthMm: quantity('Width', 'mm', 0, 40),
  thicknessMm: quantity('Thickness', 'mm', 0, 40),
  lengthMm: quantity('Length', 'mm', 0, 200),
  catalogueNumber: text('Catalogue number'),
  lot: text('Lot'),
  expiresOn: date('Expiry'),
  frontEdgeReference: choice('Front edge measured from', {
    insertions: 'the insertions',
    limbus: 'the limbus',
  }),
  frontEdgeMm: quantity('Front edge', 'mm behind', 0, 40),
  frontEdgeByQuadrantMm: group('Front edge where it differs', {
    superotemporal: quantity('Superotemporal', 'mm behind', 0, 40),
    superonasal: quantity('Superonasal', 'mm behind', 0, 40),
    inferonasal: quantity('Inferonasal', 'mm behind', 0, 40),
    inferotemporal: quantity('Inferotemporal', 'mm behind', 0, 40),
  }),
  underMuscles: choices('Runs under', recti),
  fromClock: clockHour('From'),
  toClock: clockHour('To, clockwise'),
  meridianClock: clockHour('Meridian'),
  fixation: listOrNone('Fixation', 'fixation', fixation),
  closure: orNotApplicable(closure).meta({ title: 'Ends' }),
  intention: choice('Intended as', { permanent: 'permanent', temporary: 'temporary' }),
  shortenedMm: quantity('Shortened by', 'mm', 0, 80),
  imbricatedOver: text('Imbricated over'),
  pressureWhileTensioningMmHg: quantity('Pressure while tensioning', 'mmHg', 0, 250),
  pressureSetBy: choice('Pressure set by', {
    infusion: 'infusion',
    injection: 'injection of fluid or gas',
    palpation: 'palpation only',
    tonometer: 'tonometer',
  }),
  heightMm: quantity('Height seen', 'mm', 0, 10),
});

export const buckle = group('Buckle', {
  elements: listOrNone('Elements', 'element', element),
  peritomy: choice('Conjunctival opening', {
    'full-circle': '360° peritomy',
    limited: 'limited peritomy',
    none: 'none',
  }),
  muscleSlings: z
    .union([z.literal('none'), choices('Muscles slung', recti)])
    .meta({ title: 'Muscles slung', item: 'muscle', options: recti }),
  conjunctivalClosure: orNotApplicable(
    choice('Conjunctival closure', {
      'polyglactin-910': 'polyglactin 910',
      'plain-gut': 'plain gut',
      glue: 'fibrin glue',
      cautery: 'cautery',
    }),
  ),
});
