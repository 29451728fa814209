import type { CaseRecord } from '../record/schema.ts';
import { clausesOf } from './clause.ts';
import type { ProseFinding, Reader } from './finding.ts';
import { readClockHours } from './readers/clock.ts';
import { readCounts } from './readers/counts.ts';
import { readDate } from './readers/date.ts';
import { readDone } from './readers/done.ts';
import { readDuration } from './readers/duration.ts';
import { readMeasures } from './readers/lengths.ts';
import { readLens } from './readers/lens.ts';
import { readMacula } from './readers/macula.ts';
import { readMaterials } from './readers/materials.ts';
import { readMedicine } from './readers/medicine.ts';
import { readPosture } from './readers/posture.ts';
import { readQuadrants } from './readers/quadrant.ts';
import { isOfFellowEye, readSide } from './readers/side.ts';
import { readTamponade } from './readers/tamponade.ts';

const readers: readonly Reader[] = [
  readSide,
  readTamponade,
  readClockHours,
  readQuadrants,
  readMeasures,
  readCounts,
  readMaterials,
  readLens,
  readMacula,
  readDone,
  readPosture,
  readDuration,
  readDate,
  readMedicine,
];

/**
 * Words of a text that the record denies, in the order of the text. What is not recorded denies nothing; the fellow eye,
 * history, wishes, conditions and quotations are passed over.
 */
export const readProse = (text: string, record: CaseRecord): ProseFinding[] =>
  clausesOf(text)
    .map((clause) =>
      clause.about === 'this-operation' && isOfFellowEye(clause, record)
        ? { ...clause, about: 'elsewhere' as const }
        : clause,
    )
    .flatMap((clause) => readers.flatMap((read) => read(clause, record)))
    .sort((a, b) => a.start - b.start || b.end - a.end);
