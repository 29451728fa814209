import type { CaseRecord } from '../../../src/domain/record/schema.ts';
import { isGas, isOil } from './tamponade.ts';

type Performed = NonNullable<NonNullable<CaseRecord['who']>['performed']>;

/** What was performed, read off the stages of a finished record. */
export const performedIn = (record: CaseRecord): Performed => {
  const { buckle, vitreous, drainage, retinopexy, tamponade } = record;
  const elements = Array.isArray(buckle?.elements) ? buckle.elements : [];
  const roles = elements.map((element) => element.role);
  const treatments = Array.isArray(retinopexy?.treatments) ? retinopexy.treatments : [];
  const injected = tamponade?.exchange === 'injection' && vitreous?.vitrectomy === false;
  const alone = injected && elements.length === 0;
  const parts: [boolean, Performed[number]][] = [
    [roles.includes('encircling'), 'encircling-band'],
    [roles.some((role) => role === 'segment' || role === 'meridional'), 'segmental-buckle'],
    [vitreous?.vitrectomy === true, 'vitrectomy'],
    [alone, 'pneumatic-retinopexy'],
    [vitreous?.membranesPeeled?.some((kind) => kind !== 'none') ?? false, 'membrane-peel'],
    [Array.isArray(vitreous?.retinotomies), 'retinotomy'],
    [drainage?.kind === 'external' || drainage?.kind === 'both', 'external-drainage'],
    [treatments.some((treatment) => treatment.modality === 'cryo'), 'cryotherapy'],
    [treatments.some((treatment) => treatment.modality?.includes('laser') ?? false), 'laser'],
    [isGas(tamponade?.agent) && !alone, 'gas'],
    [isOil(tamponade?.agent), 'oil'],
    [vitreous?.lensWork !== undefined && vitreous.lensWork !== 'none', 'lens-removal'],
    [typeof vitreous?.lensImplant === 'object', 'lens-implant'],
  ];
  return parts.flatMap(([done, name]) => (done ? [name] : []));
};
