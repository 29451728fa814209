import { z } from 'zod';
import {
  choice,
  choices,
  clockHour,
  group,
  listOrNone,
  quadrants,
  quantity,
  text,
  yesNo,
} from '../fields.ts';

export const retinalBreak = group('Break', {
  kind: choice('Kind', {
    horseshoe: 'horseshoe tear',
    'round-hole': 'round hole',
    operculated: 'operculated hole',
    dialysis: 'dialysis',
    'giant-tear': 'giant retinal tear',
    'macular-hole': 'macular hole',
  }),
  clock: clockHour('Clock hour'),
  quadrant: choice('Quadrant', quadrants),
  extentClockHours: quantity('Extent', 'clock hours', 0, 12),
  frontEdgeMm: quantity('Front edge', 'mm behind the limbus', 0, 40),
  backEdgeMm: quantity('Back edge', 'mm behind the limbus', 0, 40),
  zone: choice('Zone', {
    ora: 'at the ora',
    'pre-equatorial': 'between ora and equator',
    equator: 'at the equator',
    'post-equatorial': 'behind the equator',
    'posterior-pole': 'posterior pole',
  }),
  localizedBy: choices('Localized by', {
    indentation: 'indentation',
    'diathermy-mark': 'diathermy mark',
    transillumination: 'transillumination',
    'internal-view': 'internal search',
    measured: 'caliper',
  }),
  onDetachedRetina: yesNo('On detached retina'),
  treatedBy: choices('Treated by', {
    cryo: 'cryotherapy',
    laser: 'laser',
    diathermy: 'diathermy',
    none: 'not treated',
  }),
  supportedByElements: z.union([z.literal('none'), z.array(z.int().min(1).max(40)).min(1).max(40)]).meta({
    title: 'Supported by elements',
    help: 'Elements are numbered in the order of the buckle stage.',
  }),
});

const lattice = group('Lattice', {
  fromClock: clockHour('From'),
  toClock: clockHour('To, clockwise'),
  treated: yesNo('Treated'),
});

export const breaks = group('Breaks', {
  found: listOrNone('Breaks', 'break', retinalBreak),
  lattice: listOrNone('Lattice degeneration', 'patch', lattice),
  note: text('Other findings'),
});
