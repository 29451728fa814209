import { checkCase } from '../../domain/checks/check-case.ts';
import type { Settings } from '../../domain/checks/engine.ts';
import { draftNote } from '../../domain/drafting/draft.ts';
import { mergeSheet } from '../../domain/drafting/merge.ts';
import { numbersOf } from '../../domain/physics/numbers.ts';
import type { Derivers } from './desk-store.ts';

/** The domain's own answers, in the browser. The server asks the same again on save and at signature. */
export const deriversFor = (settings: Settings): Derivers => ({
  check: (record, sheet) => checkCase(record, sheet, settings),
  draft: draftNote,
  merge: mergeSheet,
  figures: numbersOf,
});
