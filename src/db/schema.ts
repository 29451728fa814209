import { sql } from 'drizzle-orm';
import {
  bigint,
  boolean,
  customType,
  date,
  index,
  integer,
  jsonb,
  pgTable,
  primaryKey,
  text,
  timestamp,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core';
import type { Role } from '../domain/access/policy.ts';
import type { Answer } from '../domain/checks/flag.ts';
import type { Sheet } from '../domain/drafting/sheet.ts';
import type { CaseRecord } from '../domain/record/schema.ts';

const bytes = customType<{ data: Buffer }>({ dataType: () => 'bytea' });
const instant = (name: string) => timestamp(name, { withTimezone: true, mode: 'date' });
const id = () => uuid('id').primaryKey().default(sql`gen_random_uuid()`);
const createdAt = () => instant('created_at').notNull().defaultNow();

/** The unit whose letterhead, wording and standards are used. */
export const units = pgTable('units', {
  id: id(),
  name: text('name').notNull(),
  service: text('service').notNull(),
  address: text('address').notNull(),
  telephone: text('telephone').notNull(),
  email: text('email').notNull(),
  demonstration: boolean('demonstration').notNull().default(false),
  version: integer('version').notNull().default(1),
});

export const people = pgTable('people', {
  id: id(),
  unitId: uuid('unit_id')
    .notNull()
    .references(() => units.id),
  email: text('email').notNull().unique(),
  name: text('name').notNull(),
  /** Printed under a signature: "Consultant vitreoretinal surgeon". */
  title: text('title').notNull(),
  roles: text('roles').array().$type<Role[]>().notNull(),
  passwordHash: text('password_hash').notNull(),
  active: boolean('active').notNull().default(true),
  createdAt: createdAt(),
});

/** The id is the SHA-256 of the token that the browser holds. */
export const sessions = pgTable('sessions', {
  id: text('id').primaryKey(),
  userId: uuid('user_id')
    .notNull()
    .references(() => people.id),
  expiresAt: instant('expires_at').notNull(),
  createdAt: createdAt(),
});

/** A case on the theatre list: its facts, its sheet and the answers to its flags, at the latest revision. */
export const cases = pgTable(
  'cases',
  {
    id: id(),
    unitId: uuid('unit_id')
      .notNull()
      .references(() => units.id),
    listDate: date('list_date', { mode: 'string' }).notNull(),
    position: integer('position').notNull(),
    surgeonId: uuid('surgeon_id').references(() => people.id),
    state: text('state', { enum: ['draft', 'signed'] })
      .notNull()
      .default('draft'),
    revision: integer('revision').notNull().default(1),
    record: jsonb('record').$type<CaseRecord>().notNull(),
    sheet: jsonb('sheet').$type<Sheet>(),
    answers: jsonb('answers').$type<Answer[]>().notNull().default([]),
    createdAt: createdAt(),
    savedAt: instant('saved_at').notNull().defaultNow(),
    savedBy: uuid('saved_by').references(() => people.id),
  },
  (table) => [index('cases_by_list').on(table.unitId, table.listDate, table.position, table.id)],
);

/** Every revision before signature, kept for the history. Append-only. */
export const caseRevisions = pgTable(
  'case_revisions',
  {
    caseId: uuid('case_id')
      .notNull()
      .references(() => cases.id),
    revision: integer('revision').notNull(),
    record: jsonb('record').$type<CaseRecord>().notNull(),
    sheet: jsonb('sheet').$type<Sheet>(),
    answers: jsonb('answers').$type<Answer[]>().notNull(),
    savedAt: instant('saved_at').notNull().defaultNow(),
    savedBy: uuid('saved_by').references(() => people.id),
  },
  (table) => [primaryKey({ columns: [table.caseId, table.revision] })],
);

/** What was signed, exactly: the canonical JSON and its hash. The database refuses to change or delete it. */
export const signedVersions = pgTable(
  'signed_versions',
  {
    id: id(),
    caseId: uuid('case_id')
      .notNull()
      .references(() => cases.id),
    version: integer('version').notNull(),
    canonical: text('canonical').notNull(),
    sha256: text('sha256').notNull(),
    verificationCode: text('verification_code').notNull(),
    signerId: uuid('signer_id')
      .notNull()
      .references(() => people.id),
    signedAt: instant('signed_at').notNull(),
    docx: bytes('docx').notNull(),
    docxSha256: text('docx_sha256').notNull(),
  },
  (table) => [
    uniqueIndex('signed_versions_of_case').on(table.caseId, table.version),
    index('signed_versions_by_time').on(table.signedAt, table.id),
  ],
);

/** What was added to a signed note later, signed in the same way. The database refuses to change or delete it. */
export const addenda = pgTable(
  'addenda',
  {
    id: id(),
    signedVersionId: uuid('signed_version_id')
      .notNull()
      .references(() => signedVersions.id),
    number: integer('number').notNull(),
    canonical: text('canonical').notNull(),
    sha256: text('sha256').notNull(),
    verificationCode: text('verification_code').notNull(),
    signerId: uuid('signer_id')
      .notNull()
      .references(() => people.id),
    signedAt: instant('signed_at').notNull(),
  },
  (table) => [uniqueIndex('addenda_of_version').on(table.signedVersionId, table.number)],
);

/** Who did what, in order; each entry holds the hash of the one before. Append-only. */
export const auditLog = pgTable(
  'audit_log',
  {
    position: bigint('position', { mode: 'number' }).primaryKey(),
    at: instant('at').notNull(),
    personId: uuid('person_id'),
    action: text('action').notNull(),
    subject: text('subject').notNull(),
    detail: jsonb('detail').$type<Record<string, string | number | boolean>>().notNull(),
    previousHash: text('previous_hash').notNull(),
    hash: text('hash').notNull(),
  },
  (table) => [index('audit_log_by_subject').on(table.subject, table.position)],
);

/** What a unit settled about a caution, each time with a reason; the latest for a rule counts. Append-only. */
export const checkSettings = pgTable(
  'check_settings',
  {
    id: bigint('id', { mode: 'number' }).primaryKey().generatedAlwaysAsIdentity(),
    unitId: uuid('unit_id')
      .notNull()
      .references(() => units.id),
    rule: text('rule').notNull(),
    setting: text('setting', { enum: ['caution', 'omission', 'off'] }).notNull(),
    reason: text('reason').notNull(),
    settledBy: uuid('settled_by')
      .notNull()
      .references(() => people.id),
    settledAt: instant('settled_at').notNull().defaultNow(),
  },
  (table) => [index('check_settings_of_unit').on(table.unitId, table.rule, table.id)],
);

/** Doctors and practices that letters go to. */
export const recipients = pgTable('recipients', {
  id: id(),
  unitId: uuid('unit_id')
    .notNull()
    .references(() => units.id),
  name: text('name').notNull(),
  kind: text('kind', { enum: ['optometrist', 'ophthalmologist', 'family-doctor', 'hospital'] }).notNull(),
  practice: text('practice').notNull(),
  address: text('address').notNull(),
  email: text('email').notNull(),
  confirmedBy: uuid('confirmed_by').references(() => people.id),
  confirmedAt: instant('confirmed_at'),
  active: boolean('active').notNull().default(true),
  revision: integer('revision').notNull().default(1),
});

/** A letter drafted from a signed version. The Message-ID is given once, so that a retry is the same message. */
export const letters = pgTable(
  'letters',
  {
    id: id(),
    signedVersionId: uuid('signed_version_id')
      .notNull()
      .references(() => signedVersions.id),
    kind: text('kind').notNull(),
    state: text('state', { enum: ['waiting', 'queued', 'sent', 'failed'] })
      .notNull()
      .default('waiting'),
    revision: integer('revision').notNull().default(1),
    sheet: jsonb('sheet').$type<Sheet>().notNull(),
    recipientId: uuid('recipient_id').references(() => recipients.id),
    messageId: text('message_id').notNull().unique(),
    attempts: integer('attempts').notNull().default(0),
    lastError: text('last_error'),
    queuedAt: instant('queued_at'),
    queuedBy: uuid('queued_by').references(() => people.id),
    sentAt: instant('sent_at'),
    sentTo: text('sent_to'),
    docx: bytes('docx'),
    createdAt: createdAt(),
  },
  (table) => [
    uniqueIndex('letters_of_version').on(table.signedVersionId, table.kind),
    index('letters_by_state').on(table.state, table.createdAt, table.id),
  ],
);

/** The coder's decision on a signed version. */
export const codings = pgTable('codings', {
  signedVersionId: uuid('signed_version_id')
    .primaryKey()
    .references(() => signedVersions.id),
  coderId: uuid('coder_id')
    .notNull()
    .references(() => people.id),
  codes: jsonb('codes').$type<{ set: string; code: string; title: string }[]>().notNull(),
  note: text('note').notNull().default(''),
  markedAt: instant('marked_at').notNull().defaultNow(),
});

/** Counters of sign-in attempts; shaped as rate-limiter-flexible expects. */
export const rateLimits = pgTable('rate_limits', {
  key: text('key').primaryKey(),
  points: integer('points').notNull().default(0),
  expire: bigint('expire', { mode: 'number' }),
});
