import type { CaseRecord } from '../record/schema.ts';
import { aboutOf, type Clause, piecesOf } from './clause.ts';
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

/** Reads one clause as if it stood at the beginning. */
const readPiece = (piece: Omit<Clause, 'about'>, record: CaseRecord): ProseFinding[] => {
  const about = aboutOf(piece.plain);
  const clause: Clause = { ...piece, start: 0, about };
  const read: Clause =
    about === 'this-operation' && isOfFellowEye(clause, record) ? { ...clause, about: 'elsewhere' } : clause;
  return readers.flatMap((reader) => reader(read, record));
};

/** Clauses remembered for one record; beyond that everything is forgotten, for a text has far fewer. */
const MOST = 4000;

/**
 * What was found in a clause, by record: the answer hangs on nothing else, and at a keystroke only one clause of a long
 * text is new.
 */
const known = new WeakMap<CaseRecord, Map<string, ProseFinding[]>>();

const foundIn = (piece: Omit<Clause, 'about'>, record: CaseRecord): ProseFinding[] => {
  const ofRecord = known.get(record) ?? new Map<string, ProseFinding[]>();
  if (ofRecord.size === 0 || ofRecord.size > MOST) {
    ofRecord.clear();
    known.set(record, ofRecord);
  }
  // What is quoted is blank in the plain words only, so both make up what was read.
  const key = `${piece.text}\n${piece.plain}`;
  const before = ofRecord.get(key);
  if (before !== undefined) return before;
  const found = readPiece(piece, record);
  ofRecord.set(key, found);
  return found;
};

/**
 * Words of a text that the record denies, in the order of the text. What is not recorded denies nothing; the fellow eye,
 * history, wishes, conditions and quotations are passed over. A record is not changed once it has been read against.
 */
export const readProse = (text: string, record: CaseRecord): ProseFinding[] =>
  piecesOf(text)
    .flatMap((piece) =>
      foundIn(piece, record).map((one) => ({
        ...one,
        start: one.start + piece.start,
        end: one.end + piece.start,
      })),
    )
    .sort((a, b) => a.start - b.start || b.end - a.end);
