import { randomUUID } from 'node:crypto';
import type { Database } from '../../db/client.ts';
import { letters } from '../../db/schema.ts';
import { mergeSheet } from '../../domain/drafting/merge.ts';
import { draftLetter, letterKindsFor } from '../../domain/letters/letters.ts';
import type { FrozenNote } from '../../domain/signing/frozen.ts';
import { config } from '../config.ts';

/** Drafts the letters that a signed note calls for, inside the transaction that signs it. Each has its Message-ID from the start. */
export const draftLettersOf = async (
  tx: Database,
  signedVersionId: string,
  { record }: FrozenNote,
): Promise<void> => {
  const host = new URL(config().publicAddress).hostname;
  const drafted = letterKindsFor(record).map((kind) => ({
    signedVersionId,
    kind,
    sheet: mergeSheet(null, draftLetter(kind, record)),
    messageId: `<${randomUUID()}@${host}>`,
  }));
  await tx.insert(letters).values(drafted);
};
