import type { UnitView } from '../api.ts';
import type { Settings } from '../checks/engine.ts';
import type { Answer, Flag } from '../checks/flag.ts';
import type { Sheet } from '../drafting/sheet.ts';
import type { CaseRecord } from '../record/schema.ts';

export const FROZEN_FORMAT = 'buckram-signed-note-1';

export const ADDENDUM_FORMAT = 'buckram-addendum-1';

/** What was added to a signed note: why, in which words, by whom. Its canonical JSON is what is hashed and kept. */
export interface FrozenAddendum {
  format: typeof ADDENDUM_FORMAT;
  /** SHA-256 of the note that it adds to. */
  noteSha256: string;
  number: number;
  reason: string;
  text: string;
  signature: { name: string; title: string; at: string; zone: string };
}

/** Everything that a signature covers. Its canonical JSON is what is hashed and kept. */
export interface FrozenNote {
  format: typeof FROZEN_FORMAT;
  caseId: string;
  version: number;
  record: CaseRecord;
  sheet: Sheet;
  flags: Flag[];
  answers: Answer[];
  unit: UnitView;
  /** What the unit had settled about its cautions. */
  settings: Settings;
  versions: { record: number; templates: string; rules: string };
  signature: {
    /** Printed name, title and meaning, as in every readable form. */
    name: string;
    title: string;
    meaning: string;
    /** Instant, ISO 8601 in UTC. */
    at: string;
    /** IANA zone in which it is printed. */
    zone: string;
  };
}
