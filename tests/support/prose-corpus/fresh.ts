import { type Sample, samplesOf } from './sample.ts';

/** Sentences of every class written after the reader had been improved on the others, and measured before it was again. */
export const fresh: readonly Sample[] = [
  ...samplesOf('side', {
    gasRight: {
      faults: [
        'Thank you for asking me to see this lady, whose [[left]] eye I operated on as an emergency yesterday.',
        'Op: [[Lt]] PPV',
        'She consented to [[left]] retinal surgery.',
        'Patching the [[left]] eye for one night after surgery.',
        '[[LE]] (gas in situ)',
        'The [[left]] superotemporal detachment was repaired.',
        'Surgery to the [[left]] went smoothly.',
      ],
      clean: ['Op: Rt PPV', 'Right superotemporal RD repaired.', 'R/E gas in situ.'],
      traps: [
        'Only a little gel was left behind the lens.',
        'Her left shoulder is stiff.',
        'The left eye was dilated and searched: no break.',
        'We left the theatre list at noon.',
        'VA R 6/9, L 6/5.',
        'She had a left hip replacement in the spring.',
        'She is left-handed.',
      ],
    },
    buckleLeft: {
      faults: [
        '[[Right]] SB + cryo, GA.',
        'Explant [[RE]].',
        'The [[right]] upper lid is swollen after the buckle.',
      ],
      traps: [
        'The right fundus was normal throughout.',
        'All right on the ward round.',
        'The right eye remains free of breaks.',
      ],
    },
  }),
  ...samplesOf('agent', {
    gasRight: {
      faults: [
        '[[C3F8]] in.',
        'Tamponade with [[perfluoropropane]].',
        'Long-acting [[C3F8]] gas was chosen.',
        'The vitreous cavity now holds [[silicone oil]].',
      ],
      clean: ['SF6 in.', 'Short-acting gas (SF6).'],
      traps: ['Neither oil nor C3F8 was needed.', 'C3F8 had been set out on the trolley but was put back.'],
    },
    oilLeft: {
      faults: ['[[SF6]] bubble, face down.', 'The eye was left with [[C3F8]] 14%.'],
      clean: ['1000-centistoke oil in.'],
    },
    buckleLeft: { faults: ['0.5 ml [[SF6]] intravitreally.', 'A small [[gas bubble]] was put in.'] },
  }),
  ...samplesOf('concentration', {
    gasRight: {
      faults: ['SF6, [[25]]%.', 'Isovolumetric [[23]]% SF6', '[[Thirty per cent]] SF6.'],
      clean: ['SF6, 20%.', '20-percent SF6.'],
      traps: ['Humidity 40%.', 'SF6 expands above 20%.'],
    },
    combinedRight: {
      faults: ['[[12 %]] perfluoropropane.', 'C3F8 mix of [[17%]].'],
      clean: ['14% perfluoropropane.'],
    },
  }),
  ...samplesOf('clock-hour', {
    gasRight: {
      faults: [
        'Tear at the [[3 o’clock]] position.',
        'A break, [[1 oclock]].',
        'SRF from [[2]] to [[6]] o’clock.',
      ],
      clean: ['Tear in the 10 o’clock position.', 'SRF from 8 to 12 o’clock.'],
      traps: ['Ward round at 8 o’clock.', 'Cotton wool spot at 4 o’clock.'],
    },
    buckleLeft: {
      faults: [
        'Hole, [[9 o’clock]].',
        'Fluid released at [[10 o’clock]].',
        'Buckle segment [[5]]–[[8]] o’clock.',
      ],
      clean: ['Holes: 1:30, 4.', 'Fluid released at 5 o’clock.'],
    },
  }),
  ...samplesOf('quadrant', {
    gasRight: {
      faults: [
        'Tear, [[lower nasal]] retina.',
        '[[Inferotemporal]] break, lasered.',
        'The break is [[infero-nasal]].',
      ],
      clean: ['Break in the upper outer retina.'],
      traps: ['Inferotemporal pigment, old.'],
    },
    combinedRight: {
      faults: ['All the breaks were [[superior]].', 'Clip in [[IN]] quadrant.'],
      clean: ['Clip in ST quadrant.'],
    },
  }),
  ...samplesOf('length', {
    buckleLeft: {
      faults: [
        'Encircled with a [[4mm]] band.',
        'Band pulled up by [[14 mm]].',
        'Axial length is [[24.1]].',
        'Indent [[2.5 mm]] high.',
        'Bite width [[8 mm]].',
      ],
      clean: ['Encircled with a 2.5mm band.', 'Band pulled up by 8 mm.'],
      traps: ['Eyelid margin 9 mm.', 'Pupil dilated to 7 mm.'],
    },
    gasRight: {
      faults: ['Trocars [[4 mm]] behind the limbus.'],
      clean: ['Trocars 3.5 mm behind the limbus.'],
    },
  }),
  ...samplesOf('count', {
    gasRight: {
      faults: ['[[Two]] tears.', 'We found [[four]] breaks.', '[[Two]] port vitrectomy.'],
      clean: ['One tear.', 'We found one break.'],
      traps: ['Two glasses of water.', 'One of three siblings.'],
    },
    combinedRight: {
      faults: ['In all, [[six]] breaks.', 'A [[pair]] of breaks was frozen.'],
      clean: ['In all, three breaks.'],
    },
  }),
  ...samplesOf('material', {
    buckleLeft: {
      faults: [
        'The tyre was of silicone [[sponge]].',
        '[[Polyester]] 5-0 to band.',
        'Held by [[scleral tunnels]].',
        'Band ends [[clipped]].',
      ],
      clean: ['Nylon 5-0 to band.', 'Band ends in a sleeve.'],
      traps: ['Silk to the lids.', 'Paper clip on the notes.'],
    },
    oilLeft: {
      faults: ['[[5000]]-centistoke oil.', 'Stained with [[indocyanine green]].'],
      clean: ['Stained with trypan blue.'],
    },
  }),
  ...samplesOf('lens', {
    gasRight: {
      faults: [
        'RE is [[phakic]].',
        'The patient is [[phakic]] with early nuclear sclerosis.',
        'The [[crystalline lens was removed]] at the same sitting.',
      ],
      clean: ['Artificial lens in place.', 'IOL in place.'],
      traps: ['Phakic fellow eye.', 'Lens cloth supplied.'],
    },
    combinedRight: {
      faults: ['The implant was put in the [[sulcus]].', '[[Aphakic]] at the end.', 'IOL [[+22.0 D]].'],
      clean: ['IOL +17.5 D in the bag.'],
    },
  }),
  ...samplesOf('macula', {
    gasRight: {
      faults: [
        'By the time of surgery the [[macula was off]].',
        'Central vision was lost as [[the macula had detached]].',
        '[[Mac-off]].',
      ],
      clean: ['The macula was on by a whisker.'],
      traps: ['We wanted to keep the macula on.', 'The macula would have come off within a day.'],
    },
    oilLeft: {
      faults: ['[[Macula attached]].'],
      clean: ['Macula detached.'],
      traps: ['Epimacular membrane.'],
    },
  }),
  ...samplesOf('posture', {
    gasRight: {
      faults: [
        'Nurse [[face down]].',
        'Keep to the [[right]] side.',
        'She may adopt [[any position]].',
        'Head [[upright]] day and night.',
      ],
      clean: ['Nurse on the left side.', 'Keep to the left side.'],
      traps: ['Avoid the supine position.', 'She sat upright for tea.'],
    },
    pneumaticRight: { faults: ['[[Face-down]] for six days.'], clean: ['Sit up for six days.'] },
  }),
  ...samplesOf('duration', {
    gasRight: {
      faults: [
        'Five days became [[nine days]] of posture on the left side.',
        'Left side, [[three days]] only.',
        'Shield [[2 nights]].',
        'Follow-up in [[5 weeks]].',
      ],
      clean: ['Left side, five days only.', 'Follow-up in just over a week.'],
      traps: ['Holiday in 3 weeks.', 'Driving after 4 weeks.'],
    },
    oilLeft: {
      faults: ['Oil out in [[10 months]].', 'The macula had been off for [[4 days]].'],
      clean: ['Oil out in four months.'],
    },
  }),
  ...samplesOf('date', {
    gasRight: {
      faults: [
        'Date of surgery: [[14.03.2026]]',
        'Clinic appointment on [[15 March 2026]].',
        'Vitrectomy, [[4th May 2026]].',
        'D.O.B. [[19-06-1968]]',
      ],
      clean: ['Date of surgery: 04.03.2026', 'Vitrectomy, 4th March 2026.'],
      traps: ['Easter is on 5 April 2026.', 'Typed 7 March 2026.'],
    },
    oilLeft: { faults: ['Oil on [[20 Feb 2026]].'], clean: ['Oil put in on 20 Jan 2026.'] },
  }),
  ...samplesOf('medicine', {
    gasRight: {
      faults: [
        'Pred acetate 1% [[x4]] daily.',
        'Cefuroxime [[1 mg]] s/c.',
        'Chloramphenicol eye drops [[5 times a day]].',
        'Prednisolone acetate 1% to be used [[three times daily]].',
      ],
      clean: ['Chloramphenicol eye drops 4 times a day.'],
      traps: ['Amlodipine 5 mg od.', 'Lactulose 10 ml bd.'],
    },
    oilLeft: {
      faults: ['Acetazolamide tablets [[125 mg]] twice daily.'],
      clean: ['Acetazolamide tablets 250 mg twice daily.'],
    },
  }),
  ...samplesOf('negation', {
    gasRight: {
      faults: [
        'The break was [[left untreated]].',
        '[[No vitrectomy]].',
        'We [[froze]] the tear.',
        'SRF was [[not drained]].',
        'Some SRF [[remained]].',
        'A scleral [[buckle]] was sewn on.',
      ],
      clean: ['We did not use cryo.', 'No buckle.', 'No fluid remained.'],
      traps: ['No one else was present.', 'Not a drop was spilt.', 'No change in her tablets.'],
    },
    buckleLeft: {
      faults: [
        '[[Gas]] was given.',
        'The fluid was left [[undrained]].',
        'Vitreous was removed by [[vitrectomy]].',
        '[[Without cryotherapy]].',
      ],
      clean: ['No gas was given.', 'The vitreous was not touched.'],
      traps: ['No pain.', 'No sutures were cut.'],
    },
    oilLeft: {
      faults: [
        '[[No peel]] was needed.',
        '[[Uneventful]] surgery [[negation=without complication]].',
        'The retina was [[not flat]] at the end.',
      ],
      clean: ['The retina was flat under oil.'],
    },
  }),
].map((sample) => ({ ...sample, heldOut: true }));
