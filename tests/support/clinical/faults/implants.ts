import type { CaseRecord } from '../../../../src/domain/record/schema.ts';
import { addDays, dateOf } from '../calendar.ts';
import { hasLongGas, hasOil, inFamily } from './fault.ts';

const implants = inFamily('implants');
const hasLens = (r: CaseRecord) => typeof r.vitreous?.lensImplant === 'object';

export const implantFaults = [
  implants.inItem(
    ['element-without-lot', 'omission', 'An element without its lot'],
    'buckle.elements',
    () => ({ lot: undefined }),
  ),
  implants.inItem(
    ['element-without-number', 'omission', 'An element without its catalogue number'],
    'buckle.elements',
    () => ({ catalogueNumber: undefined }),
  ),
  implants.inItem(
    ['element-without-expiry', 'omission', 'An element without its expiry'],
    'buckle.elements',
    () => ({ expiresOn: undefined }),
  ),
  implants.inItem(
    ['element-out-of-date', 'contradiction', 'An expired element'],
    'buckle.elements',
    (_, r) => ({ expiresOn: addDays(dateOf(r.who?.startedAt ?? ''), -45) }),
  ),
  implants.inItem(
    ['element-without-width', 'omission', 'An element without its width'],
    'buckle.elements',
    () => ({ widthMm: undefined }),
  ),
  implants.inItem(
    ['element-without-thickness', 'omission', 'An element without its thickness'],
    'buckle.elements',
    () => ({ thicknessMm: undefined }),
  ),
  implants.inItem(
    ['element-without-material', 'omission', 'An element without its material'],
    'buckle.elements',
    () => ({ material: undefined }),
  ),
  implants.inItem(
    ['element-without-form', 'omission', 'An element without its form'],
    'buckle.elements',
    () => ({ form: undefined }),
  ),
  implants.inItem(
    ['element-without-role', 'omission', 'An element without its role'],
    'buckle.elements',
    () => ({ role: undefined }),
  ),
  implants.wrong(['lens-without-lot', 'omission', 'A lens implant without its lot'], (r) =>
    hasLens(r) ? { 'vitreous.lensImplant.lot': undefined } : null,
  ),
  implants.wrong(['lens-without-power', 'omission', 'A lens implant without its power'], (r) =>
    hasLens(r) ? { 'vitreous.lensImplant.powerDioptres': undefined } : null,
  ),
  implants.wrong(['lens-without-position', 'omission', 'A lens implant without its position'], (r) =>
    hasLens(r) ? { 'vitreous.lensImplant.position': undefined } : null,
  ),
  implants.wrong(['lens-out-of-date', 'contradiction', 'An expired lens'], (r) =>
    hasLens(r) ? { 'vitreous.lensImplant.expiresOn': addDays(dateOf(r.who?.startedAt ?? ''), -45) } : null,
  ),
  implants.wrong(
    ['lens-implant-not-listed', 'contradiction', 'A lens implant, not among the procedures'],
    (r) =>
      hasLens(r)
        ? {
            'who.performed': (r.who?.performed ?? []).filter((p) => p !== 'lens-implant'),
            'who.planned': (r.who?.planned ?? []).filter((p) => p !== 'lens-implant'),
          }
        : null,
  ),
  implants.missing(['gas-without-lot', 'omission', 'A gas without its lot'], 'tamponade.lot', hasLongGas),
  implants.missing(['oil-without-lot', 'omission', 'Oil without its lot'], 'tamponade.lot', hasOil),
  implants.missing(
    ['gas-without-expiry', 'omission', 'A gas without its expiry'],
    'tamponade.expiresOn',
    hasLongGas,
  ),
];
