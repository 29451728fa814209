import { samplesOf } from './sample.ts';

export const agent = samplesOf('agent', {
  gasRight: {
    faults: [
      'Fluid-air exchange followed by [[C3F8]].',
      'The eye was filled with [[silicone oil]].',
      'Air–[[C2F6]] exchange, ports out, all dry.',
      'Tamponade: [[oil 1000 cSt]].',
      'A [[C3F8]] bubble was left in the eye.',
      'We used [[perfluoropropane]] gas to hold the retina in place.',
      '25G PPV, EL, [[air]] tamponade only.',
      'Your eye contains [[silicone oil]], which will need to be taken out.',
      'PPV + laser + [[octafluoropropane]] 20%.',
      'After drainage through the break the cavity was flushed with 20% [[hexafluoroethane]] and the ports taken out.',
      'Gas used: [[C3F8]]. Wristband on.',
      '[[Oil]] fill complete at the end of the case.',
    ],
    clean: [
      'Fluid-air exchange followed by 20% SF6.',
      'Air-gas exchange with sulphur hexafluoride.',
      'PPV, laser, sulfur hexafluoride 20 per cent.',
      'Your eye contains a gas bubble.',
      'Fluid–air exchange, then SF₆ for air.',
      'SF6 gas in situ – no flying, no N2O.',
      'Air was exchanged for SF6 20%.',
    ],
    traps: [
      'C3F8 would be used if the retina were to detach again.',
      'Silicone oil was discussed but not thought necessary.',
      'Should it fail, oil will be needed.',
      'She had heard of “oil in the eye” and was worried.',
      'The other eye had C3F8 at another hospital.',
      'No oil was used.',
      'We chose SF6 rather than C3F8.',
      'The patient breathed room air.',
      'Under air the retina settled flat.',
      'The instruments were oiled before sterilisation.',
      'Her father was treated with silicone oil years ago.',
    ],
  },
  buckleLeft: {
    faults: [
      '[[SF6]] was injected at the end.',
      'Buckle, cryo, drainage and [[air]] injection.',
      'A bubble of [[C3F8]] was put in to support the break.',
      '[[Silicone oil]] was put in.',
    ],
    clean: [
      'No tamponade was used.',
      'No gas or oil in the eye.',
      'Buckle, cryo, drainage; no gas.',
      'The band is of solid silicone.',
    ],
    traps: [
      'If the detachment recurs, vitrectomy with SF6 would be the next step.',
      'A silicone sleeve joined the ends.',
      'Gas was not injected.',
      'As there is no gas in the eye he may fly.',
      'General anaesthesia with oxygen, air and sevoflurane.',
    ],
  },
  oilLeft: {
    faults: [
      'Air was exchanged for [[C3F8]].',
      '23G PPV, peel, retinectomy, EL, [[SF6]].',
      '[[Heavy silicone oil]] was put in to support the inferior retina.',
      'A long-acting gas ([[C3F8]]) was used for tamponade.',
      'At the end the eye was full of [[gas]].',
      'Your eye has been filled with [[gas]] and you must not fly.',
      'Air–[[gas]] exchange, sclerotomies sutured.',
    ],
    clean: [
      'Air–oil exchange, 1000 cSt.',
      'Silicone oil was put in to 95% fill.',
      'SiO in, ROSO in about 4 months.',
      'Oil tamponade, inferior PI.',
      'The PFCL was taken out completely before the oil went in.',
    ],
    traps: [
      'He had C3F8 at the first operation in November.',
      'Previous PPV + C3F8 (14%) failed inferiorly.',
      'Oil rather than gas was chosen because he cannot posture.',
      'At removal of oil, SF6 may be used.',
      'Fluid–air exchange was done before the oil.',
      'Heavy oil was not available.',
      'When the oil comes out we may put in gas.',
    ],
  },
  pneumaticRight: {
    faults: [
      '0.3 ml of [[SF6]] was injected through the pars plana.',
      'Pneumatic retinopexy with [[air]] 0.3 ml.',
      'Cryo then pure [[SF6]], 30G needle.',
    ],
    clean: [
      '0.3 ml of pure C3F8 was injected through the pars plana.',
      'Pneumatic with perfluoropropane, single bubble.',
    ],
    traps: ['SF6 was out of stock, so C3F8 was used.', 'Vitrectomy with SF6 if this does not work.'],
  },
  combinedRight: {
    faults: ['PPV/EB/phaco/cryo/[[SF6]]', 'Fluid-air, air-[[oil]] exchange.', 'Mixed 14% [[C2F6]] was used.'],
    clean: ['PPV/EB/phaco/cryo/C3F8', 'A gas which lasts about eight weeks (C3F8) was put in.'],
    traps: ['With a band, SF6 might have been enough, but he lives alone and C3F8 was preferred.'],
  },
  giantLeft: {
    faults: [
      'Direct PFCL–[[oil]] exchange.',
      'The heavy liquid was exchanged for air and then for [[C3F8]].',
      '27G PPV, PFCL, EL, [[SF6]] 16%.',
    ],
    clean: [
      'PFCL–air exchange, then C2F6 16%.',
      'The heavy liquid was taken out and perfluoroethane put in.',
    ],
    traps: ['Oil is kept for a recurrence.', 'PFCL was used to unroll the flap.'],
  },
  dialysisLeft: {
    faults: [
      'Segmental sponge with [[SF6]] 0.4 ml.',
      'An [[air]] bubble was injected to restore the pressure.',
    ],
    clean: ['No gas, no drainage.'],
    traps: ['Gas may be added in the clinic if the fluid does not settle.'],
  },
});
