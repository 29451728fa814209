import type { CaseRecord } from '../record/schema.ts';
import { clausesOf } from './clause.ts';
import type { ProseFinding, Reader } from './finding.ts';
import { readAftercare } from './readers/aftercare.ts';
import { readCounts, readMaterials, readMeasures } from './readers/measure.ts';
import { readClockHours, readQuadrants } from './readers/place.ts';
import { readSide } from './readers/side.ts';
import { readDone, readLens, readMacula } from './readers/state.ts';
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
  readAftercare,
];

/**
 * Words of a text that the record denies, in the order of the text. What is not recorded denies nothing; the fellow eye,
 * history, wishes, conditions and quotations are passed over.
 */
export const readProse = (text: string, record: CaseRecord): ProseFinding[] =>
  clausesOf(text)
    .flatMap((clause) => readers.flatMap((read) => read(clause, record)))
    .sort((a, b) => a.start - b.start || b.end - a.end);
