import { and, desc, eq, sql } from 'drizzle-orm';
import type { Database } from '../../db/client.ts';
import { auditLog, cases, signedVersions } from '../../db/schema.ts';
import type { CaseSigned } from '../../domain/api.ts';
import { canonical } from '../../domain/signing/canonical.ts';
import type { FrozenNote } from '../../domain/signing/frozen.ts';
import { firstBrokenPosition } from '../audit/log.ts';
import { noteDocx } from '../documents/note-docx.ts';
import { sha256 } from './sign.ts';

type Row = typeof signedVersions.$inferSelect;

export interface SignedNote {
  row: Row;
  note: FrozenNote;
}

export const signedOf = ({ id, version, sha256: hash, verificationCode, signedAt }: Row): CaseSigned => ({
  signedVersionId: id,
  version,
  sha256: hash,
  verificationCode,
  signedAt: signedAt.toISOString(),
});

/** What was signed, as it was signed. */
export const readSigned = async (
  db: Database,
  unitId: string,
  by: { id: string } | { caseId: string },
): Promise<SignedNote | undefined> => {
  const wanted = 'id' in by ? eq(signedVersions.id, by.id) : eq(signedVersions.caseId, by.caseId);
  const [found] = await db
    .select({ row: signedVersions })
    .from(signedVersions)
    .innerJoin(cases, eq(signedVersions.caseId, cases.id))
    .where(and(wanted, eq(cases.unitId, unitId)))
    .orderBy(desc(signedVersions.version))
    .limit(1);
  if (found === undefined) return undefined;
  const note: FrozenNote = JSON.parse(found.row.canonical);
  return { row: found.row, note };
};

export interface Proof {
  title: string;
  holds: boolean;
}

/** Looks on the spot whether a note is what was signed: each thing that must hold, and whether it does. */
export const prove = async (db: Database, { row, note }: SignedNote): Promise<Proof[]> => {
  const [entry] = await db
    .select({ detail: auditLog.detail })
    .from(auditLog)
    .where(and(eq(auditLog.action, 'note:signed'), sql`${auditLog.subject} = ${row.id}`));
  const remade = Buffer.from(await noteDocx(note, { sha256: row.sha256, code: row.verificationCode }));
  return [
    { title: 'The text is in its canonical form', holds: canonical(note) === row.canonical },
    { title: 'Its SHA-256 is the one stored at signature', holds: sha256(row.canonical) === row.sha256 },
    { title: 'The log holds the same SHA-256', holds: entry?.detail.sha256 === row.sha256 },
    { title: 'The document is the one stored at signature', holds: sha256(row.docx) === row.docxSha256 },
    {
      title: 'The document made again from the facts is the same, byte for byte',
      holds: remade.equals(row.docx),
    },
    { title: 'The chain of the log is unbroken', holds: (await firstBrokenPosition(db)) === null },
  ];
};
