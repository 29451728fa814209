import { and, asc, eq, inArray } from 'drizzle-orm';
import type { Database } from '../../db/client.ts';
import { addenda, auditLog } from '../../db/schema.ts';
import { canonical, verificationCode } from '../../domain/signing/canonical.ts';
import { firstBrokenPosition } from '../audit/log.ts';
import { sha256 } from './sha256.ts';
import type { SignedNote } from './signed-version.ts';

export interface Proof {
  title: string;
  holds: boolean;
}

const entriesAbout = (db: Database, signedVersionId: string) =>
  db
    .select({ action: auditLog.action, detail: auditLog.detail })
    .from(auditLog)
    .where(
      and(eq(auditLog.subject, signedVersionId), inArray(auditLog.action, ['note:signed', 'note:added-to'])),
    )
    .orderBy(asc(auditLog.position));

/** Number and hash of each addendum: as kept when its text still has that hash, so that both places can be compared. */
const addendaIn = async (db: Database, signedVersionId: string): Promise<string[]> => {
  const rows = await db
    .select({ number: addenda.number, canonical: addenda.canonical })
    .from(addenda)
    .where(eq(addenda.signedVersionId, signedVersionId))
    .orderBy(asc(addenda.number));
  return rows.map((row) => `${row.number} ${sha256(row.canonical)}`);
};

/** Looks on the spot whether a note is what was signed: each thing that must hold, and whether it does. */
export const prove = async (db: Database, { row, note }: SignedNote): Promise<Proof[]> => {
  const entries = await entriesAbout(db, row.id);
  const signatures = entries.filter(({ action }) => action === 'note:signed');
  const signature = signatures[0]?.detail;
  const added = entries
    .filter(({ action }) => action === 'note:added-to')
    .map(({ detail }) => `${detail.number} ${detail.sha256}`);
  const textHash = sha256(row.canonical);
  const isLabelled =
    note.caseId === row.caseId &&
    note.version === row.version &&
    note.signature.at === row.signedAt.toISOString() &&
    verificationCode(textHash) === row.verificationCode;
  return [
    { title: 'The text is in its canonical form', holds: canonical(note) === row.canonical },
    { title: 'Its SHA-256 is the one stored at signature', holds: textHash === row.sha256 },
    { title: 'Case, version, time and verification code are those of the text', holds: isLabelled },
    { title: 'The document is the one stored at signature', holds: sha256(row.docx) === row.docxSha256 },
    {
      title: 'The log holds one signature, with the SHA-256 of text and document',
      holds:
        signatures.length === 1 &&
        signature?.sha256 === textHash &&
        signature.docxSha256 === sha256(row.docx),
    },
    {
      title: 'The log holds the SHA-256 of each addendum, and of no other',
      holds: added.join() === (await addendaIn(db, row.id)).join(),
    },
    { title: 'The chain of the log is unbroken', holds: (await firstBrokenPosition(db)) === null },
  ];
};
