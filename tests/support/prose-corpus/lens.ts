import { samplesOf } from './sample.ts';

export const lens = samplesOf('lens', {
  gasRight: {
    faults: [
      'The eye is [[phakic]].',
      'RE [[phakic]], macula on.',
      '[[Aphakic]] right eye with bullous RD.',
      'The [[natural lens is clear]].',
      'There was a moderate [[cataract]].',
      'Lens: [[aphakia]].',
      '[[Phakic]] macula-on RRD',
      'Right [[phaco]]vitrectomy, SF6.',
      'A [[lensectomy]] was done.',
      'The surgery was combined with [[phacoemulsification and an implant]].',
      'In this [[phakic]] patient the vitreous base was shaved with care under indentation so as to avoid touching the lens.',
    ],
    clean: [
      'The eye is pseudophakic.',
      'RE pseudophakic, macula on.',
      'PCIOL in the bag, stable.',
      'Pseudophakic RD, 3 years after cataract surgery.',
      'An IOL is present in the right eye.',
      'Cataract surgery was done in 2023.',
      'The lens was not touched.',
      'Pseudophakia, YAG done.',
    ],
    traps: [
      'The left eye is phakic with mild cataract.',
      'A contact lens was used for viewing.',
      'The wide-angle lens was lowered.',
      'Phakic eyes often develop cataract after gas.',
      'Fellow eye phakic.',
      'Her mother had cataract.',
      'No cataract formation is to be expected, as the lens is artificial.',
      'A 28 D lens was used with the indirect.',
      '“I was told I had a cataract,” she said.',
      'LE: cataract, listed for phaco.',
    ],
  },
  buckleLeft: {
    faults: [
      'The eye is [[pseudophakic]].',
      'LE [[aphakic]].',
      '[[PCIOL]] in place.',
      'Young [[pseudophake]] with round holes.',
      'Visually significant [[cataract]] in the operated eye.',
      '[[Pseudophakic]], macula on, no PVD.',
    ],
    clean: [
      'The lens is clear.',
      'Phakic, macula on, no PVD.',
      'He is phakic and the lens was not touched.',
      'OS phakic',
    ],
    traps: [
      'Cataract may develop sooner after surgery.',
      'He wears contact lenses.',
      'Should cataract surgery be needed, the axial length must be measured again.',
    ],
  },
  oilLeft: {
    faults: [
      'The eye is [[pseudophakic]].',
      'LE [[phakic]], recurrent RD.',
      '[[PCIOL]] stable in the bag.',
      '[[Lensectomy]] through the pars plana.',
      'An [[IOL]] was put in the sulcus.',
    ],
    clean: [
      'Aphakic left eye, inferior PI made.',
      'LE aphakic.',
      'No lens implant was used.',
      'In view of aphakia an inferior iridectomy was made.',
    ],
    traps: [
      'Right eye pseudophakic.',
      'A secondary IOL will be considered when the oil is out.',
      'A contact lens will be tried later.',
    ],
  },
  pneumaticRight: {
    faults: [
      '[[Pseudophakic]] RD suitable for a pneumatic.',
      'RE [[aphakic]], one superior tear.',
      'An [[IOL]] is in the bag.',
    ],
    clean: ['Phakic RD suitable for a pneumatic.', 'The crystalline lens was not touched by the needle.'],
    traps: ['Cataract is more likely after a gas injection.', 'Contact lens biomicroscopy showed one tear.'],
  },
  combinedRight: {
    faults: [
      'The eye was [[pseudophakic]] before surgery.',
      '[[Aphakic]] before surgery.',
      'The lens was [[left alone]].',
      '[[Lensectomy]], PPV and C3F8.',
      'The IOL was placed in the [[sulcus]].',
      'The patient was left [[aphakic]].',
      'The lens implant power was [[21.0 D]].',
    ],
    clean: [
      'Phaco with IOL in the bag, then PPV.',
      'Cataract and RD, treated in one sitting.',
      'Phacoemulsification, 17.5 D one-piece acrylic in the bag.',
      'The eye is now pseudophakic.',
    ],
    traps: ['The left eye is phakic.', 'A sulcus lens was at hand.'],
  },
  giantLeft: {
    faults: [
      '[[Phaco]]vitrectomy with PFCL and C2F6.',
      'The [[pseudophakic]] left eye had a giant tear.',
      'The [[lens was removed by phacoemulsification]].',
      '[[IOL]] put in the bag at the end.',
    ],
    clean: [
      'The cataract was left for a second operation.',
      'Phakic with early cataract.',
      'The lens was spared.',
    ],
    traps: ['Phaco and IOL in six months.', 'He will need cataract surgery.'],
  },
  dialysisLeft: {
    faults: ['[[Pseudophakic]], dialysis IT.', '[[Aphakic]] after trauma.'],
    clean: ['Phakic, no lens damage.'],
    traps: ['Traumatic cataract can follow.'],
  },
});
