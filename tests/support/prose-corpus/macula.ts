import { samplesOf } from './sample.ts';

export const macula = samplesOf('macula', {
  gasRight: {
    faults: [
      '[[Macula off]] RRD right eye.',
      '[[Mac off]], ST bullous.',
      'RE [[macula-off]] detachment, VA 6/9.',
      'The macula was [[detached]].',
      'The [[macula had come off]] before surgery.',
      'The [[macula was split]] by the fluid.',
      'The fovea was [[off]].',
      'Sadly the detachment had already [[involved the macula]].',
      '[[Fovea-off]] RD, PPV, SF6.',
      'Mac [[off for 3 days]].',
    ],
    clean: [
      'Macula on RRD right eye.',
      'Mac on, ST bullous.',
      'The macula was attached.',
      'The detachment had not reached the macula.',
      'Macula-on; same-day surgery.',
      'Fovea on.',
      'The macula was still on when she came to theatre.',
      'Macula not involved.',
      'The macula was spared.',
    ],
    traps: [
      'Surgery was brought forward so that the macula would not come off.',
      'Had the macula come off, sight would have suffered.',
      'Her left macula has drusen.',
      'She was told of the signs of a macula-off detachment.',
      'There was a risk of the macula coming off.',
      'No macula off at any stage.',
      'If macula off, surgery within a week is usual.',
      'The macula was threatened.',
      'The retina was detached superotemporally but the macula was on.',
    ],
  },
  oilLeft: {
    faults: [
      '[[Macula on]] recurrent RD.',
      'LE [[mac on]], PVR CP.',
      'The macula was [[attached]] before surgery.',
      'The [[macula was spared]].',
      '[[Fovea on]].',
      'The macula was [[split]].',
      'Macula [[not involved]].',
      '[[Mac-on]] RD with inferior PVR',
    ],
    clean: [
      'Macula off recurrent RD.',
      'LE mac off 3 weeks, PVR CP.',
      'The macula was detached for 21 days.',
      'The detachment involved the macula.',
      'Macula-off; guarded prognosis.',
    ],
    traps: [
      'In November the macula was on.',
      'The right macula is on and healthy.',
      'At the end the macula was flat under oil.',
      'If the macula stays attached, sight may improve.',
    ],
  },
  combinedRight: {
    faults: [
      '[[Macula on]] RD with VH.',
      'The macula was [[still attached]].',
      'Mac [[on]], 3 breaks.',
      'RD 2–9 o’clock, [[macula on]], PVR B, cataract.',
    ],
    clean: [
      'Macula off 4/7.',
      'Mac off RD with VH.',
      'The macula had been off for four days.',
      'Foveal detachment for four days.',
    ],
    traps: ['Macula on in the fellow eye.', 'The macula was attached at the end of surgery.'],
  },
  pneumaticRight: {
    faults: [
      '[[Macula on]], one superior break.',
      '[[Macula off for a day]].',
      'Mac [[on]] RD.',
      'The macula was [[wholly detached]].',
    ],
    clean: ['Macula split.', 'The macula was bisected by the fluid.', 'Mac split RD'],
    traps: ['The left macula is flat.'],
  },
  buckleLeft: {
    faults: [
      '[[Mac off]] RD, no PVD.',
      'Macula [[off]], two round holes.',
      'The detachment had [[reached the fovea]].',
    ],
    clean: ['Mac on RD, no PVD.', 'Macula on throughout.', 'The macula was never detached.'],
    traps: ['Were the macula to detach, surgery would be more urgent.', 'Macular OCT normal.'],
  },
  giantLeft: {
    faults: ['GRT, [[macula on]].', 'The macula was completely [[off]].'],
    clean: ['GRT, macula split.'],
    traps: ['Risk of macular fold explained.'],
  },
});
