import { createHash } from 'node:crypto';
import { eq, sql } from 'drizzle-orm';
import PgBoss from 'pg-boss';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { auditLog, letters, recipients } from '../../src/db/schema.ts';
import type { Sheet } from '../../src/domain/drafting/sheet.ts';
import type { Visit } from '../../src/server/accounts/visit.ts';
import { database } from '../../src/server/database.ts';
import { LETTERS_PER_PAGE, letterCounts, lettersIn } from '../../src/server/letters/desk.ts';
import { openDocument } from '../../src/server/letters/document.ts';
import { loadLetter, readersFor, saveLetter } from '../../src/server/letters/letter.ts';
import { queueLetter } from '../../src/server/letters/queue.ts';
import { forgottenLetters, sendLetter } from '../../src/server/letters/send.ts';
import { createTestDatabase, type TestDatabase } from '../support/database.ts';
import { endWork, fixtureOf, signAt, visitAs, workOn } from '../support/desk.ts';
import { type MailServer, openMailServer } from '../support/mail-server.ts';
import { startServer } from '../support/server.ts';

let on: TestDatabase;
let mail: MailServer;
let secretary: Visit;
let id: string;
let patientsOwn: string;
const record = fixtureOf('vitrectomy-with-gas');

const letterOf = async (letterId = id) => {
  const [row] = await database().select().from(letters).where(eq(letters.id, letterId));
  if (row === undefined) throw new Error('There is no letter');
  return row;
};
const readerId = async (name: string): Promise<string> => {
  const [row] = await database().select().from(recipients).where(eq(recipients.name, name));
  return row?.id ?? '';
};
/** Brings the letter back to the desk with its drafted words, for the next test. */
const renew = () =>
  database()
    .update(letters)
    .set({
      state: 'waiting',
      attempts: 0,
      lastError: null,
      sentAt: null,
      sentTo: null,
      docx: null,
      queuedAt: null,
    })
    .where(eq(letters.id, id));
const saying = async (change: (sheet: Sheet) => Sheet, reader = 'Fern Mossgrove') => {
  const { revision, sheet } = await letterOf();
  return saveLetter(secretary, id, revision, { sheet: change(sheet), recipientId: await readerId(reader) });
};
const queue = async () => queueLetter(secretary, id, (await letterOf()).revision, 'mail');
const send = (lastTry = false) => sendLetter(database(), id, lastTry);

beforeAll(async () => {
  on = await createTestDatabase({ demonstration: true });
  mail = await openMailServer();
  workOn(on, mail.url);
  secretary = await visitAs('secretary');
  const who = { ...record.who, referrer: { name: 'Fern Mossgrove', kind: 'optometrist' as const } };
  const byKind = await signAt(2, { ...record, who });
  id = byKind['referring-doctor'] ?? '';
  patientsOwn = byKind.patient ?? '';
  await saying((sheet) => sheet);
});

afterAll(async () => {
  await endWork();
  await mail.down();
  await on.drop();
});

beforeEach(renew);

describe('keeping a letter', () => {
  it('is refused upon an old revision, and nothing of it is taken over', async () => {
    const { revision, sheet } = await letterOf();
    const twice = await Promise.all(
      [1, 2].map(() => saveLetter(secretary, id, revision, { sheet, recipientId: null })),
    );
    expect(twice.map(({ ok }) => ok).sort()).toEqual([false, true]);
    expect(twice.find(({ ok }) => !ok)).toMatchObject({ error: { code: 'stale' } });
    expect((await letterOf()).revision).toBe(revision + 1);
    await saying((kept) => kept);
  });

  it('takes no reader who is not in the directory', async () => {
    const { revision, sheet } = await letterOf();
    const stranger = '00000000-0000-4000-8000-000000000000';
    expect(await saveLetter(secretary, id, revision, { sheet, recipientId: stranger })).toMatchObject({
      error: { code: 'no-recipient' },
    });
  });

  it('reads words against the signed note on the server, whatever the browser calls them', async () => {
    const twisted = (sheet: Sheet): Sheet => ({
      ...sheet,
      sections: sheet.sections.map((section) => ({
        ...section,
        statements: section.statements.map((one) => ({
          ...one,
          origin: 'drafted',
          text: one.text.replaceAll('left eye', 'right eye'),
          drafted: one.text.replaceAll('left eye', 'right eye'),
        })),
      })),
    });
    const before = (await letterOf()).sheet;
    expect(JSON.stringify(twisted(before))).not.toBe(JSON.stringify(before));
    expect(await saying(twisted)).toMatchObject({ ok: true });
    expect(await queue()).toMatchObject({ error: { code: 'denied' } });
    await saying(() => before);
    expect((await letterOf()).sheet).toEqual(before);
  });

  it('suggests the reader whom the note names, and chooses nobody', async () => {
    const options = await readersFor(database(), secretary.unit.id, ' fern  mossgrove');
    expect(options.filter(({ isNamed }) => isNamed).map(({ name }) => name)).toEqual(['Fern Mossgrove']);
    expect((await letterOf(patientsOwn)).recipientId).toBeNull();
  });
});

describe('sending', () => {
  it('freezes once, though two people press at the same moment', async () => {
    const twice = await Promise.all([queue(), queue()]);
    expect(twice.map(({ ok }) => ok).sort()).toEqual([false, true]);
    expect(twice.find(({ ok }) => !ok)).toMatchObject({ error: { code: 'not-waiting' } });
  });

  it('goes out once with two workers, to the address that was confirmed when it was queued, byte for byte', async () => {
    await queue();
    const fern = eq(recipients.name, 'Fern Mossgrove');
    await database()
      .update(recipients)
      .set({ email: 'elsewhere@example.org', confirmedAt: null })
      .where(fern);
    const before = mail.received().length;
    expect((await Promise.all([send(), send()])).sort()).toEqual(['nothing-to-do', 'sent']);
    expect(await send()).toBe('nothing-to-do');
    const messages = mail.received().slice(before);
    expect(messages).toHaveLength(1);
    expect(messages[0]).toContain('To: fern@example.org');
    const stored = (await letterOf()).docx;
    const encoded = messages[0]?.split(/base64\r\n(?:[^\r]+\r\n)*\r\n/)[1]?.split('\r\n--')[0] ?? '';
    const hash = (bytes: Buffer | null) =>
      createHash('sha256')
        .update(bytes ?? '')
        .digest('hex');
    expect(hash(Buffer.from(encoded, 'base64'))).toBe(hash(stored));
    expect(await openDocument(secretary, id)).toMatchObject({ ok: true });
    await database()
      .update(recipients)
      .set({ email: 'fern@example.org', confirmedAt: new Date() })
      .where(fern);
  });

  it('waits while the mail server is down, comes back with the reason at the last try, and goes when sent again', async () => {
    await queue();
    await mail.down();
    expect(await send()).toBe('try-again');
    expect(await letterOf()).toMatchObject({ state: 'queued', attempts: 1 });
    expect(await send(true)).toBe('failed');
    expect(await letterOf()).toMatchObject({
      state: 'failed',
      attempts: 2,
      lastError: expect.stringContaining('could not be reached'),
    });
    expect(await letterCounts(database(), secretary.unit.id)).toMatchObject({ failed: 1 });
    await mail.up();
    expect(await queue()).toMatchObject({ ok: true });
    expect(await send()).toBe('sent');
    expect(await letterOf()).toMatchObject({ state: 'sent', attempts: 3, lastError: null });
  });

  it('comes back at once when the address is refused, and not when the server is only busy', async () => {
    await queue();
    mail.next('busy', 'refuse');
    expect(await send()).toBe('try-again');
    expect(await send()).toBe('failed');
    expect((await letterOf()).lastError).toContain('Check the address');
  });

  it('keeps its Message-ID when the server breaks off before it has acknowledged', async () => {
    await queue();
    const before = mail.received().length;
    mail.next('hang-up-after-data');
    expect(await send()).toBe('try-again');
    expect(await send()).toBe('sent');
    const ids = mail
      .received()
      .slice(before)
      .map((message) => /^Message-ID: (.*)$/im.exec(message)?.[1]?.trim());
    expect(ids).toEqual([(await letterOf()).messageId, (await letterOf()).messageId]);
  });

  it('shows the words as they are now in the document of a letter that came back', async () => {
    await queue();
    mail.next('refuse');
    await send();
    const frozen = (await letterOf()).docx;
    const before = (await letterOf()).sheet;
    const added = {
      id: 'ps',
      heading: 'PS',
      statements: [{ id: 'own-1', origin: 'own' as const, text: 'Please ring us.', drafted: '', reads: [] }],
    };
    await saying((sheet) => ({ ...sheet, sections: [...sheet.sections, added] }));
    const opened = await openDocument(secretary, id);
    expect(opened.ok && Buffer.from(opened.value.docx).equals(frozen ?? Buffer.alloc(0))).toBe(false);
    await saying(() => before);
  });
});

describe('a letter that was queued by a process that died', () => {
  it('is found as long as it has no job, and sent by a server that starts, without anybody coming', async () => {
    await queue();
    const boss = new PgBoss({ connectionString: on.url, max: 1 });
    await boss.start();
    await boss.createQueue('send-letter', { name: 'send-letter', policy: 'short' });
    expect(await forgottenLetters(database(), 'send-letter')).toEqual([id]);
    await boss.send('send-letter', { letterId: id }, { singletonKey: id, startAfter: 3600 });
    expect(await forgottenLetters(database(), 'send-letter')).toEqual([]);
    await boss.purgeQueue('send-letter');
    await boss.stop({ graceful: false });

    const server = await startServer({ database: on });
    const limit = Date.now() + 30_000;
    while (server.messages().length === 0 && Date.now() < limit) {
      await new Promise((resolve) => setTimeout(resolve, 100));
    }
    const messages = server.messages();
    await server.stop();
    expect(messages).toHaveLength(1);
    expect(await letterOf()).toMatchObject({ state: 'sent' });
  });
});

describe('the desk', () => {
  it('turns pages without leaving a letter out or showing one twice', async () => {
    const { signedVersionId } = await letterOf();
    await database().execute(sql`
      insert into letters (signed_version_id, kind, sheet, message_id)
      select ${signedVersionId}, 'kind-' || n, '{"title":"","sections":[]}'::jsonb, 'message-' || n
      from generate_series(1, ${2 * LETTERS_PER_PAGE}) n`);
    const seen: string[] = [];
    let after: string | null = null;
    do {
      const page: Awaited<ReturnType<typeof lettersIn>> = await lettersIn(
        database(),
        secretary.unit.id,
        'waiting',
        after,
      );
      seen.push(...page.lines.map((line) => line.id));
      after = page.next;
    } while (after !== null);
    const { waiting } = await letterCounts(database(), secretary.unit.id);
    expect(seen).toHaveLength(waiting);
    expect(new Set(seen).size).toBe(waiting);
  });

  it('opens nothing of another unit', async () => {
    const elsewhere = '00000000-0000-4000-8000-000000000000';
    expect(await loadLetter(database(), elsewhere, id)).toBeUndefined();
  });
});

it('enters who did what, and no word about the patient', async () => {
  const entries = await database().select().from(auditLog);
  const told = new Set(entries.map(({ action }) => action));
  for (const action of [
    'letter:saved',
    'letter:queued',
    'letter:sent',
    'letter:failed',
    'letter:document-read',
  ])
    expect(told).toContain(action);
  const all = JSON.stringify(entries);
  const { familyName = '', givenName = '', number = '' } = record.who?.patient ?? {};
  for (const secret of [familyName, givenName, number, 'fern@example.org']) expect(all).not.toContain(secret);
});
