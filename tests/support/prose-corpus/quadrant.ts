import { samplesOf } from './sample.ts';

export const quadrant = samplesOf('quadrant', {
  gasRight: {
    faults: [
      'There was a horseshoe tear in the [[superonasal]] quadrant.',
      'Single [[inferotemporal]] HST.',
      'The tear was [[inferonasal]].',
      '[[IN]] break lasered.',
      'An [[inferior]] horseshoe tear was found.',
      'The [[lower nasal]] tear was treated with laser.',
      'ST detachment with a U-tear in the [[upper nasal]] quadrant.',
      'A [[supero-nasal]] tear at the 10 o’clock meridian was lasered.',
      'You had a tear in the [[lower outer]] part of the retina.',
      'HST [[infero-temporally]], flat after drainage.',
      'The horseshoe tear in the [[SN]] quadrant was found on internal search.',
    ],
    clean: [
      'There was a horseshoe tear in the superotemporal quadrant.',
      'Single ST HST.',
      'The upper temporal tear was treated with laser.',
      'Supero-temporal break at 10 o’clock.',
      'HST superotemporally, flat after drainage.',
    ],
    traps: [
      'The infusion was placed inferotemporally.',
      'The inferonasal retina was flat and without breaks.',
      'Old laser in the inferotemporal quadrant of the left eye.',
      'No break was seen superonasally.',
      'A sub-Tenon’s block was given inferonasally.',
      'Vitreous was shaved in all quadrants, inferonasal last.',
      'If an inferior break should open, oil would be needed.',
      'Break in ST quadrant.',
    ],
  },
  buckleLeft: {
    faults: [
      'Round holes in the superotemporal and [[inferonasal]] quadrants.',
      'Ends joined with a sleeve in the [[inferotemporal]] quadrant.',
      'The sleeve was placed [[superotemporally]].',
      'Atrophic hole [[inferonasally]], frozen.',
      'The round hole in the [[superonasal]] quadrant was indented and frozen.',
      'Both holes lay [[nasally]].',
      'A [[SN]] round hole and an IT round hole.',
    ],
    clean: [
      'Round holes in the superotemporal and inferotemporal quadrants.',
      'The band was joined with a silicone sleeve superonasally.',
      'One mattress suture in each quadrant: ST, SN, IN and IT.',
      'ST and IT round holes.',
      'Both holes lay temporally.',
    ],
    traps: [
      'The inferonasal quadrant was flat.',
      'The superonasal vortex vein was spared.',
      'The conjunctiva was opened with a nasal relieving cut.',
      'The fellow eye has inferotemporal lattice.',
      'Nasal oxygen 2 l/min.',
    ],
  },
  oilLeft: {
    faults: [
      'HST in the [[superotemporal]] quadrant.',
      'Iatrogenic break [[superonasally]].',
      'Round hole [[ST]], horseshoe tear IT.',
      '[[Superior]] retinectomy, edge lasered.',
      'A [[superior]] peripheral iridectomy was made.',
    ],
    clean: [
      'HST inferotemporally, round hole inferonasally.',
      'Inferior retinectomy, edge lasered.',
      'Inferior PI made with the cutter.',
      'Breaks in both inferior quadrants.',
    ],
    traps: [
      'In November the break was superonasal.',
      'Chandelier superiorly.',
      'The superior retina was flat.',
      'Extra 23G port superonasally.',
    ],
  },
  combinedRight: {
    faults: [
      'The clip lies in the [[inferonasal]] quadrant.',
      'HSTs in the inferotemporal and [[superotemporal]] quadrants.',
      'Breaks SN, IT and [[IN]].',
      'The band was clipped [[superonasally]].',
    ],
    clean: [
      'Breaks SN and IT.',
      'The clip lies in the superotemporal quadrant.',
      'Tunnels in all four quadrants.',
    ],
    traps: ['Superotemporal port for the cutter.', 'Fluid reached the superotemporal arcade.'],
  },
  pneumaticRight: {
    faults: [
      'One [[superotemporal]] tear.',
      'Tear [[inferiorly]] treated with cryo.',
      '[[IT]] horseshoe tear, cryo x4.',
    ],
    clean: ['One superonasal tear.', 'Superior break, suitable for a pneumatic.', 'SN HST, cryo.'],
    traps: ['Gas was injected inferotemporally.'],
  },
  dialysisLeft: {
    faults: [
      '[[Superonasal]] dialysis after blunt trauma.',
      'Sponge in the [[inferonasal]] quadrant.',
      'Dialysis [[ST]].',
    ],
    clean: ['Inferotemporal dialysis after blunt trauma.', 'IT dialysis, cryo, sponge.'],
    traps: ['Iris tear superonasally, old.'],
  },
  giantLeft: {
    faults: ['Giant tear in the [[inferonasal]] quadrant.', '[[Nasal]] GRT with rolled edge.'],
    clean: ['Superotemporal GRT with rolled edge.'],
    traps: ['Old laser inferonasally from 2019.'],
  },
});
