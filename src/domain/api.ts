import { z } from 'zod';
import type { CaseState, Role } from './access/policy.ts';
import type { Answer, Flag } from './checks/flag.ts';
import { type Sheet, sheet } from './drafting/sheet.ts';
import type { RecordIssue } from './record/read.ts';
import { type CaseRecord, caseRecord } from './record/schema.ts';

/** What pages/api and the islands say to each other about a case. */

export interface UnitView {
  name: string;
  service: string;
  address: string;
  telephone: string;
  email: string;
  demonstration: boolean;
}

export interface CaseView {
  id: string;
  state: CaseState;
  revision: number;
  record: CaseRecord;
  /** `null` until the first draft was saved. */
  sheet: Sheet | null;
  answers: Answer[];
  /** Instant, ISO 8601. */
  savedAt: string;
}

export interface PersonView {
  name: string;
  title: string;
  roles: Role[];
}

/** PUT /api/cases/ID with `If-Match: "REVISION"`. The server adds who answered, and when. */
export const saveCase = z.strictObject({
  record: caseRecord,
  sheet,
  answers: z
    .array(z.strictObject({ flag: z.string().max(2000), reason: z.string().trim().min(3).max(1000) }))
    .max(200),
});
export type SaveCase = z.infer<typeof saveCase>;

export interface CaseSaved {
  revision: number;
  savedAt: string;
  flags: Flag[];
  answers: Answer[];
}

export const meanings = {
  author: 'I performed this operation and this note is my account of it',
  'responsible-surgeon': 'I am responsible for this operation and have reviewed this note',
} as const;

/** POST /api/cases/ID/sign with `If-Match: "REVISION"`. */
export const signCase = z.strictObject({
  password: z.string().min(1).max(200),
  meaning: z.enum(['author', 'responsible-surgeon']),
});
export type SignCase = z.infer<typeof signCase>;

export interface CaseSigned {
  signedVersionId: string;
  version: number;
  sha256: string;
  verificationCode: string;
  signedAt: string;
}

/**
 * Every refusal of the API: a permanent code, a sentence that says what to do, and what is needed to do it.
 * 401 `sign-in-needed` or `wrong-password`; 403 `not-allowed`; 404 `not-found`; 409 `already-signed` or `blocked`
 * (with flags); 412 `stale` (with the current case); 422 `invalid` (with issues); 429 `too-many-attempts`; 500 `failed`.
 */
export interface ApiError {
  code: string;
  message: string;
  issues?: RecordIssue[];
  flags?: Flag[];
  current?: CaseView;
}
