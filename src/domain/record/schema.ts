import { z } from 'zod';
import { aftercare } from './stages/aftercare.ts';
import { anaesthesia } from './stages/anaesthesia.ts';
import { before } from './stages/before.ts';
import { breaks } from './stages/breaks.ts';
import { buckle } from './stages/buckle.ts';
import { drainage } from './stages/drainage.ts';
import { endOfCase } from './stages/end-of-case.ts';
import { retinopexy } from './stages/retinopexy.ts';
import { tamponade } from './stages/tamponade.ts';
import { vitreous } from './stages/vitreous.ts';
import { who } from './stages/who.ts';

export const RECORD_VERSION = 1;

/**
 * The facts of one case, by stage in the order of the operation. Every field may be absent, so that a record can be
 * kept half-done; `'none'` and `'not-applicable'` are said, never implied.
 */
export const caseRecord = z
  .strictObject({
    version: z.literal(RECORD_VERSION),
    who: who.optional(),
    before: before.optional(),
    anaesthesia: anaesthesia.optional(),
    breaks: breaks.optional(),
    buckle: buckle.optional(),
    vitreous: vitreous.optional(),
    drainage: drainage.optional(),
    retinopexy: retinopexy.optional(),
    tamponade: tamponade.optional(),
    endOfCase: endOfCase.optional(),
    aftercare: aftercare.optional(),
  })
  .meta({ title: 'Case record' });

export type CaseRecord = z.infer<typeof caseRecord>;
export type Stage = Exclude<keyof CaseRecord, 'version'>;

export const stages = Object.keys(caseRecord.shape).filter((key) => key !== 'version') as Stage[];

export const emptyRecord = (): CaseRecord => ({ version: RECORD_VERSION });

type ItemOf<T> = Exclude<NonNullable<T>, string> extends readonly (infer U)[] ? U : never;

export type RetinalBreak = ItemOf<NonNullable<CaseRecord['breaks']>['found']>;
export type BuckleElement = ItemOf<NonNullable<CaseRecord['buckle']>['elements']>;
export type Fixation = ItemOf<BuckleElement['fixation']>;
export type RetinopexyTreatment = ItemOf<NonNullable<CaseRecord['retinopexy']>['treatments']>;
export type Posture = ItemOf<NonNullable<CaseRecord['aftercare']>['posture']>;
export type Eye = NonNullable<NonNullable<CaseRecord['who']>['eye']>;
export type TamponadeAgent = NonNullable<NonNullable<CaseRecord['tamponade']>['agent']>;
export type Quadrant = NonNullable<RetinalBreak['quadrant']>;
