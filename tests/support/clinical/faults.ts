import { aftercareFaults, letterFaults } from './faults/aftercare.ts';
import { breakFaults } from './faults/breaks.ts';
import { buckleFaults } from './faults/buckle.ts';
import { diagnosisFaults } from './faults/diagnosis.ts';
import type { Fault } from './faults/fault.ts';
import { implantFaults } from './faults/implants.ts';
import { medicineFaults } from './faults/medicines.ts';
import { postureFaults } from './faults/posture.ts';
import { refractionFaults } from './faults/refraction.ts';
import { retinopexyFaults } from './faults/retinopexy.ts';
import { sideFaults } from './faults/side.ts';
import { standardFaults } from './faults/standards.ts';
import { tamponadeFaults } from './faults/tamponade.ts';
import { teamFaults } from './faults/team.ts';
import { closureFaults, tensionFaults } from './faults/tension.ts';
import { timeFaults } from './faults/time.ts';
import { drainageFaults, vitreousFaults } from './faults/vitreous.ts';

export type { Fault } from './faults/fault.ts';

/** What goes wrong on paper, one fault at a time. */
export const faults: readonly Fault[] = [
  ...sideFaults,
  ...timeFaults,
  ...teamFaults,
  ...diagnosisFaults,
  ...breakFaults,
  ...buckleFaults,
  ...tensionFaults,
  ...closureFaults,
  ...vitreousFaults,
  ...drainageFaults,
  ...retinopexyFaults,
  ...tamponadeFaults,
  ...postureFaults,
  ...aftercareFaults,
  ...implantFaults,
  ...medicineFaults,
  ...refractionFaults,
  ...standardFaults,
  ...letterFaults,
];
