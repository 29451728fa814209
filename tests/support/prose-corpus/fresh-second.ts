import { type Sample, samplesOf } from './sample.ts';

/** A second set written later; the reader was improved on it only after its figures had been taken. */
export const freshSecond: readonly Sample[] = [
  ...samplesOf('side', {
    gasRight: {
      faults: [
        'Retinal detachment [[LE]], repaired under LA.',
        'Following urgent surgery for her [[left]] retinal detachment she made a good recovery.',
        'The [[left]] conjunctiva was opened.',
        'Indication: RRD [[left]] eye.',
        'The patient had a [[left]] sided macula-on detachment.',
        'Dexamethasone was injected beneath the [[left]] conjunctiva.',
        'Vitrectomy [[OS]] without complication.',
      ],
      clean: [
        'RRD right eye, LA.',
        'Vitrectomy OD without complication.',
        'Right retina attached at the end.',
      ],
      traps: [
        'She has an artificial left eye.',
        'The trolley stood on the left.',
        'LE amblyopic since childhood.',
        'Nothing abnormal was found in the left eye.',
        'We turned left at the optic disc.',
        'Her left eye is unaffected.',
      ],
    },
    dialysisLeft: {
      faults: ['Ball injury to the [[right]] eye with dialysis.', '[[RE]] sponge segment + cryo'],
      traps: ['The right eye was uninjured.', 'He is right-handed.'],
    },
  }),
  ...samplesOf('agent', {
    gasRight: {
      faults: ['The final tamponade was [[C3F8]].', 'Vitrectomy and [[oil]].', 'Fill: [[air]].'],
      clean: ['The final tamponade was SF6.', 'A gas tamponade was used.'],
      traps: ['Her sister had oil put into her eye.', 'Air was seen in the drip.', 'Olive oil for the ears.'],
    },
    oilLeft: {
      faults: ['The air was replaced by [[SF6]].', 'Endolaser, [[C3F8]], sutures.'],
      clean: ['The air was replaced by silicone oil.'],
    },
  }),
  ...samplesOf('concentration', {
    gasRight: {
      faults: ['The SF6 was mixed to [[30%]].', 'Gas concentration [[14%]].'],
      clean: ['The SF6 was mixed to 20%.', 'Gas concentration 20%.'],
      traps: ['Oxygen saturation 98%.', 'Betadine 10% to the skin.'],
    },
    giantLeft: { faults: ['We used C2F6 in a [[20%]] mixture.'], clean: ['We used C2F6 in a 16% mixture.'] },
  }),
  ...samplesOf('clock-hour', {
    gasRight: {
      faults: [
        'The tear lay between [[1]] and [[2]] o’clock.',
        '[[3 o’clock]] HST.',
        'Bullous RD with HST at [[5:30]].',
      ],
      clean: ['10 o’clock HST.'],
      traps: ['She last ate at 7 o’clock.', 'Operation finished by 11:20.'],
    },
    oilLeft: {
      faults: ['Retinectomy extended from [[12]] to [[3]] o’clock.'],
      clean: ['Retinectomy extended from 4 to 8 o’clock.'],
    },
    combinedRight: {
      faults: ['Tears at 2 o’clock, 7 o’clock and [[11 o’clock]].'],
      clean: ['Tears at 2 o’clock, 7 o’clock and 8:30.'],
    },
  }),
  ...samplesOf('quadrant', {
    gasRight: {
      faults: [
        'Break found [[inferonasally]].',
        'In the [[superonasal]] quadrant lay a horseshoe tear.',
        'HST [[SN]] quadrant.',
      ],
      clean: ['In the superotemporal quadrant lay a horseshoe tear.'],
      traps: ['Block given in the inferotemporal quadrant.'],
    },
    buckleLeft: {
      faults: ['The holes were both in the [[nasal]] retina.'],
      clean: ['The holes were both in the temporal retina.'],
    },
  }),
  ...samplesOf('length', {
    buckleLeft: {
      faults: [
        'A solid silicone band, [[5 mm]] wide, was used.',
        'The band was drawn up by [[4 mm]].',
        'Sutures with a [[6 mm]] bite.',
        'Its front edge lay [[5 mm]] behind the insertions.',
      ],
      clean: ['A solid silicone band, 2.5 mm wide, was used.', 'Sutures with a 4.5 mm bite.'],
      traps: ['The hyphaema was 1 mm deep.'],
    },
    combinedRight: {
      faults: ['Ports were placed [[3.5 mm]] behind the limbus.', 'The axial length measured [[24.6]] mm.'],
      clean: ['The axial length measured 26.4 mm.'],
    },
  }),
  ...samplesOf('count', {
    gasRight: {
      faults: [
        '[[Several]] breaks were seen.',
        'There were [[two]] horseshoe tears.',
        'Laser burns: [[900]].',
      ],
      clean: ['Only one tear was seen.'],
      traps: ['Two days ago she was well.'],
    },
    buckleLeft: {
      faults: ['A [[single]] round hole was found.', 'The [[three]] holes were treated.'],
      clean: ['The two holes were treated.'],
    },
  }),
  ...samplesOf('material', {
    buckleLeft: {
      faults: [
        'Scleral sutures of [[polyester]].',
        'A [[sponge]] explant was used.',
        'The band was fastened by a [[clip]].',
      ],
      clean: ['Scleral sutures of nylon.'],
      traps: ['Nylon gloves are not worn.'],
    },
    dialysisLeft: { faults: ['Sutured with [[nylon]] 5-0.'], clean: ['Sutured with polyester 5-0.'] },
  }),
  ...samplesOf('lens', {
    gasRight: {
      faults: ['Lens status: [[phakic]].', 'Her own [[lens is clear]].'],
      clean: ['Lens status: pseudophakic.'],
      traps: ['She takes off her contact lens at night.'],
    },
    buckleLeft: {
      faults: ['[[Lens implant]] in good position.', 'Lens: [[pseudophakia]]'],
      clean: ['Lens: clear'],
    },
  }),
  ...samplesOf('macula', {
    gasRight: {
      faults: [
        'RD with [[macula off]] since Sunday.',
        'The [[fovea was detached]].',
        'Status of the macula: [[off]].',
      ],
      clean: ['RD with macula on.'],
      traps: ['The macula was about to come off.'],
    },
    combinedRight: {
      faults: ['The [[macula was not involved]].', '[[Fovea on]] at surgery.'],
      clean: ['The fovea was detached.'],
    },
  }),
  ...samplesOf('posture', {
    gasRight: {
      faults: [
        'She has been asked to posture [[face down]].',
        '[[Right side]] down, please.',
        'Sleep [[upright]].',
      ],
      clean: ['She has been asked to posture on her left side.'],
      traps: ['Put the dressing face down on the pad.'],
    },
    oilLeft: {
      faults: ['Keep your head [[upright]].', 'Lie on your [[right side]].'],
      clean: ['Keep your face down.'],
    },
  }),
  ...samplesOf('duration', {
    gasRight: {
      faults: [
        'Posturing is to go on for [[two weeks]].',
        'See in [[six weeks]].',
        'Chloramphenicol for [[a fortnight]].',
      ],
      clean: ['Posturing is to go on for five days.'],
      traps: ['She has been a widow for 6 years.'],
    },
    oilLeft: {
      faults: ['Oil removal is planned in about [[a year]].', 'Macula off for [[one week]] only.'],
      clean: ['Oil removal in about 4 months.'],
    },
  }),
  ...samplesOf('date', {
    gasRight: {
      faults: [
        'I saw and operated on this lady on [[24 March 2026]].',
        'Next visit: [[2 April 2026]].',
        'DoB [[19 June 1985]].',
      ],
      clean: ['I saw and operated on this lady on 4 March 2026.', 'DoB 19 June 1958.'],
      traps: ['Her last eye test was on 10 January 2026.'],
    },
    buckleLeft: { faults: ['Buckle surgery, [[14/04/2026]].'], clean: ['Buckle surgery, 15/04/2026.'] },
  }),
  ...samplesOf('medicine', {
    gasRight: {
      faults: [
        'Please use chloramphenicol [[twice a day]].',
        'Cefuroxime [[750 mg]] under the conjunctiva.',
        'Prednisolone acetate [[0.1%]] six times daily.',
      ],
      clean: ['Please use chloramphenicol four times a day.'],
      traps: ['Ramipril 5 mg bd.'],
    },
    buckleLeft: {
      faults: ['Cyclopentolate [[three times a day]] for a week.', 'Dexamethasone [[1%]] qds.'],
      clean: ['Cyclopentolate twice a day for a week.'],
    },
  }),
  ...samplesOf('negation', {
    gasRight: {
      faults: [
        '[[Cryo]] and gas.',
        'A [[buckle]] was used as well.',
        'Subretinal fluid was [[not drained]].',
        'There were [[complications]].',
        '[[No laser]] was given.',
        'A [[retinotomy]] was made for drainage.',
        'The [[ILM]] was stripped.',
      ],
      clean: [
        'Laser and gas.',
        'A buckle was not used.',
        'There were no complications.',
        'No retinotomy was made.',
      ],
      traps: ['No flying.', 'Without her glasses she sees little.', 'No known allergies.'],
    },
    buckleLeft: {
      faults: [
        'The hole was treated with [[laser]].',
        'This was a [[non-drain]] procedure.',
        'A three-port [[vitrectomy]] followed.',
        '[[No cryotherapy]] was needed.',
      ],
      clean: ['Treated with cryo.', 'No vitrectomy.'],
      traps: ['No bleeding, no pain.'],
    },
    oilLeft: {
      faults: ['There were [[no complications]].', '[[PVR was absent]].', 'A [[buckle]] was added.'],
      clean: ['PVR was present.'],
    },
  }),
].map((sample) => ({ ...sample, heldOut: true }));
