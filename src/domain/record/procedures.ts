/** The operations and steps that a case can be planned or recorded as. */
export const procedures = {
  'encircling-band': 'encircling band',
  'segmental-buckle': 'segmental buckle',
  vitrectomy: 'pars plana vitrectomy',
  'pneumatic-retinopexy': 'pneumatic retinopexy',
  'membrane-peel': 'membrane peel',
  retinotomy: 'retinotomy or retinectomy',
  'external-drainage': 'external drainage',
  cryotherapy: 'cryotherapy',
  laser: 'laser retinopexy',
  gas: 'gas tamponade',
  oil: 'silicone oil tamponade',
  'oil-removal': 'removal of silicone oil',
  'lens-removal': 'lens removal',
  'lens-implant': 'lens implant',
  'element-removal': 'removal or release of a buckling element',
} as const;

export type Procedure = keyof typeof procedures;
