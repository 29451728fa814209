import { mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { createTransport } from 'nodemailer';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { startMailCatcher } from '../../../scripts/lib/mail-catcher.mjs';

const folder = mkdtempSync(join(tmpdir(), 'buckram-mail-'));
let catcher: Awaited<ReturnType<typeof startMailCatcher>>;

beforeAll(async () => {
  catcher = await startMailCatcher({
    folder,
    refuse: (address) =>
      address.startsWith('nobody@') ? { code: 550, message: 'No such mailbox' } : undefined,
  });
});

afterAll(async () => {
  await catcher.stop();
  rmSync(folder, { recursive: true });
});

const send = (to: string) =>
  createTransport(catcher.url).sendMail({
    from: 'unit@example.org',
    to,
    subject: 'A letter',
    text: 'The words of the letter',
  });

it('keeps each message whole, under a name that says nothing of it', async () => {
  await send('doctor@example.org');
  const [name = '', ...others] = readdirSync(folder);
  expect(others).toEqual([]);
  expect(name).toMatch(/^[\dTZ.-]+-[0-9a-f]{8}\.eml$/);
  const message = readFileSync(join(folder, name), 'utf8');
  expect(message).toContain('Subject: A letter');
  expect(message).toContain('The words of the letter');
});

it('refuses whom it was told to refuse', async () => {
  await expect(send('nobody@example.org')).rejects.toMatchObject({ responseCode: 550 });
});
