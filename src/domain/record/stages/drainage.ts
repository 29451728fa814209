import { choice, clockHour, group } from '../fields.ts';

export const drainage = group('Drainage', {
  kind: choice('Drainage of subretinal fluid', {
    none: 'none',
    external: 'external',
    internal: 'internal',
    both: 'external and internal',
  }),
  internalThrough: choice('Internally through', {
    break: 'the break',
    retinotomy: 'a drainage retinotomy',
  }),
  externalMethod: choice('Externally by', {
    needle: 'needle',
    'cut-down': 'scleral cut-down',
    laser: 'laser choroidotomy',
  }),
  clock: clockHour('Where'),
  outcome: choice('Outcome', {
    complete: 'fluid drained completely',
    partial: 'some fluid left',
    dry: 'no fluid came',
    haemorrhage: 'haemorrhage at the site',
    incarceration: 'retinal incarceration',
  }),
});
