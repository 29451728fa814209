import { z } from 'zod';
import { choice, count, group, listOrNone, quantity, yesNo } from '../fields.ts';

const treatment = group('Treatment', {
  modality: choice('Modality', {
    cryo: 'cryotherapy',
    endolaser: 'endolaser',
    'indirect-laser': 'indirect laser',
    'slit-lamp-laser': 'slit-lamp laser',
    'trans-scleral-laser': 'trans-scleral laser',
    diathermy: 'diathermy',
  }),
  targets: z
    .union([
      z.literal('all-breaks'),
      z.literal('circumferential'),
      z.array(z.int().min(1).max(40)).min(1).max(40),
    ])
    .meta({
      title: 'Targets',
      options: { 'all-breaks': 'all breaks', circumferential: '360°' },
      help: 'All breaks, 360°, or the numbers of breaks.',
    }),
  applications: count('Applications or spots', 5000),
  rows: count('Rows', 10),
  powerMilliwatts: quantity('Power', 'mW', 0, 5000),
  durationMilliseconds: quantity('Duration', 'ms', 0, 5000),
  endpointFirstWhitening: yesNo('To first whitening'),
});

export const retinopexy = group('Retinopexy', {
  treatments: listOrNone('Retinopexy', 'treatment', treatment),
});
