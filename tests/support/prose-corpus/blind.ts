import { type Sample, samplesOf } from './sample.ts';

/** Sentences by which the reader was never improved. Leave them so, and write others when one of them shows a fault. */
export const blind: readonly Sample[] = [
  ...samplesOf('side', {
    gasRight: {
      faults: [
        'Emergency repair, [[left]] eye, same day.',
        'She came to us with a curtain over her [[left]] eye and had it operated on that afternoon.',
        'Gas in [[LE]], keep wristband on.',
        '[[Left]] PPV/gas – day 1: IOP 16.',
        'The [[left]] retina was reattached.',
      ],
      clean: ['Emergency repair, right eye, same day.', 'Gas in RE.'],
      traps: [
        'The left eye had no retinal breaks.',
        'Vision in her left eye is excellent.',
        'Lids left open.',
        'The left pupil reacts briskly.',
      ],
    },
    oilLeft: {
      faults: ['[[RE]]: oil in situ.', 'Oil was put into the [[right]] eye.'],
      clean: ['LE: oil in situ.'],
      traps: ['His right eye has 6/6 vision.', 'Right, the plan is as follows.'],
    },
  }),
  ...samplesOf('agent', {
    gasRight: {
      faults: ['[[C3F8]] was left in at the end.', '[[Silicone oil]] tamponade in view of inferior breaks.'],
      clean: ['SF6 was left in at the end.'],
      traps: ['Gas cooker at home.'],
    },
    oilLeft: {
      faults: ['Closed under [[gas]].', 'Tamponade: [[C2F6]].'],
      clean: ['Tamponade: silicone oil.'],
    },
  }),
  ...samplesOf('concentration', {
    combinedRight: {
      faults: ['C3F8 was diluted to [[10%]].', '[[18 per cent]] C3F8 exchange.'],
      clean: ['C3F8 was diluted to 14%.'],
      traps: ['Haematocrit 42%.'],
    },
  }),
  ...samplesOf('clock-hour', {
    buckleLeft: {
      faults: ['Needle drainage, [[10 o’clock]].', 'Small holes at [[12]] and [[6]] o’clock.'],
      clean: ['Needle drainage, 5 o’clock.'],
      traps: ['Tea at 4 o’clock.'],
    },
    giantLeft: {
      faults: ['The giant tear ran from [[5]] to [[8]] o’clock.'],
      clean: ['The giant tear ran from 11:30 to 3:30.'],
    },
  }),
  ...samplesOf('quadrant', {
    dialysisLeft: {
      faults: ['The dialysis was [[superotemporal]].', 'Dialysis in the [[lower nasal]] quadrant.'],
      clean: ['The dialysis was inferotemporal.'],
    },
  }),
  ...samplesOf('length', {
    combinedRight: {
      faults: [
        'A [[three millimetre]] band was used.',
        'The band was shortened [[9 mm]].',
        'Axial length [[21,9]] mm.',
      ],
      clean: ['The band was shortened 6 mm.'],
      traps: ['A 3 mm naevus was seen.'],
    },
  }),
  ...samplesOf('count', {
    combinedRight: {
      faults: ['[[Four]] breaks in all.', 'A total of [[two]] breaks was found.', '[[Four]]-port PPV.'],
      clean: ['Three breaks in all.'],
      traps: ['Four family members.'],
    },
  }),
  ...samplesOf('material', {
    combinedRight: {
      faults: ['The ends were joined with a [[sleeve]].', 'A [[tyre]] was used.'],
      clean: ['The ends were joined with a clip.'],
    },
    oilLeft: { faults: ['Silicone oil of [[5000 cSt]].'], clean: ['Silicone oil of 1000 cSt.'] },
  }),
  ...samplesOf('lens', {
    pneumaticRight: {
      faults: ['This [[pseudophakic]] lady had gas injected.', 'Status: [[aphakic]].'],
      clean: ['This phakic lady had gas injected.'],
      traps: ['A three-mirror lens was used.'],
    },
  }),
  ...samplesOf('macula', {
    giantLeft: {
      faults: ['[[Macula-on]] giant tear.', 'The [[macula was entirely off]].'],
      clean: ['Macula-splitting giant tear.'],
      traps: ['OCT of the macula next time.'],
    },
  }),
  ...samplesOf('posture', {
    giantLeft: {
      faults: ['To lie on the [[left side]] please.', 'He must sit [[upright]].'],
      clean: ['To lie on the right side please.'],
      traps: ['He lay on his left side last time.'],
    },
  }),
  ...samplesOf('duration', {
    giantLeft: {
      faults: [
        'Right side posture for [[4 days]].',
        'Review in [[two months]].',
        'Levofloxacin for [[3 weeks]].',
      ],
      clean: ['Levofloxacin for one week.'],
      traps: ['He smoked for 20 years.'],
    },
  }),
  ...samplesOf('date', {
    giantLeft: {
      faults: ['Operated [[2 July 2026]].', 'To be seen again on [[19 July 2026]].', 'DOB [[10/10/1980]].'],
      clean: ['Operated 1 July 2026.'],
      traps: ['Flu vaccine on 3 October 2025.'],
    },
  }),
  ...samplesOf('medicine', {
    giantLeft: {
      faults: [
        'Levofloxacin to be instilled [[twice daily]].',
        'Pred acetate 1% [[eight times a day]].',
        'Levofloxacin [[1.5%]] qds.',
      ],
      clean: ['Levofloxacin to be instilled four times daily.'],
      traps: ['Bisoprolol 2.5 mg od.'],
    },
  }),
  ...samplesOf('negation', {
    giantLeft: {
      faults: [
        'Heavy liquid was [[not used]].',
        '[[Cryotherapy]] was applied.',
        'A [[buckle]] was placed.',
        '[[lens=Lensectomy]].',
        '[[No laser]] was needed.',
      ],
      clean: ['Heavy liquid was used.', 'No buckle was placed.'],
      traps: ['No trouble with the flap.', 'Not yet ready for glasses.'],
    },
    buckleLeft: {
      faults: [
        'A [[vitrectomy]] was needed.',
        'SRF was [[not drained]].',
        '[[Complications: choroidal haemorrhage]].',
      ],
      clean: ['A vitrectomy was not needed.', 'Complications: none.'],
    },
  }),
].map((sample) => ({ ...sample, heldOut: true }));
