import { readFileSync } from 'node:fs';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { demonstrationPeople } from '../../src/server/demonstration-people.ts';
import { expectAccessible, launchBrowser, watchComplaints } from '../support/browser.ts';
import { createTestDatabase, type TestDatabase } from '../support/database.ts';
import { signInAs } from '../support/person.ts';
import { startServer, type TestServer } from '../support/server.ts';

let database: TestDatabase;
let server: TestServer;
let browser: Browser;

/** Puts a complete case on the list and signs it, so that every desk has something to do. */
const signOne = async (): Promise<void> => {
  const surgeon = await signInAs(server.url, 'surgeon');
  const list = await (await surgeon.get('/')).text();
  const id = [...list.matchAll(/\/cases\/([0-9a-f-]{36})/g)].at(-1)?.[1];
  const record = JSON.parse(
    readFileSync(new URL('../fixtures/vitrectomy-with-gas.json', import.meta.url), 'utf8'),
  );
  record.who.referrer = { name: 'Fern Mossgrove', kind: 'optometrist' };
  const sheet = { title: 'Operative note', sections: [] };
  await surgeon.send('PUT', `/api/cases/${id}`, { record, sheet, answers: [] }, 1);
  const signed = await surgeon.send(
    'POST',
    `/api/cases/${id}/sign`,
    { password: 'demonstration-surgeon', meaning: 'author' },
    2,
  );
  if (signed.status !== 200) throw new Error(await signed.text());
};

beforeAll(async () => {
  database = await createTestDatabase({ demonstration: true });
  server = await startServer({ database });
  browser = await launchBrowser();
  await signOne();
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
  await database?.drop();
});

const enter = async (who: string, path: string, width = 1440): Promise<Page> => {
  const person = demonstrationPeople.find(({ email }) => email.startsWith(`${who}@`));
  const context = await browser.newContext({ viewport: { width, height: 900 } });
  const page = await context.newPage();
  await page.goto(`${server.url}/sign-in?next=${path}`);
  await page.fill('#email', person?.email ?? '');
  await page.fill('#password', person?.password ?? '');
  await page.keyboard.press('Enter');
  await page.waitForURL((url) => url.pathname !== '/sign-in');
  await page.goto(server.url + path);
  return page;
};

const follow = async (page: Page): Promise<void> => {
  await page.locator('tbody a').first().click();
  await page.waitForLoadState('networkidle');
};

const desks: readonly (readonly [who: string, path: string, opens: boolean])[] = [
  ['surgeon', '/', false],
  ['secretary', '/letters', true],
  ['secretary', '/recipients', false],
  ['coder', '/coding', true],
  ['auditor', '/auditing', true],
  ['administrator', '/people', false],
  ['administrator', '/unit', false],
  ['administrator', '/unit/checks', false],
  ['auditor', '/handbook', false],
];

describe.each(desks)('%s at %s', (who, path, opens) => {
  it.each([1440, 390])('is accessible, complains of nothing and fits at %i pixels', async (width) => {
    const page = await enter(who, path, width);
    const complaints = watchComplaints(page);
    const look = async () => {
      await expectAccessible(page);
      const overflow = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
      expect(overflow).toBeLessThanOrEqual(0);
    };
    await look();
    if (opens) {
      await follow(page);
      await look();
    }
    expect(complaints).toEqual([]);
    await page.context().close();
  });
});

describe('pages without a visit or a right', () => {
  it('are accessible too', async () => {
    const context = await browser.newContext();
    const page = await context.newPage();
    await page.goto(`${server.url}/sign-in`);
    await expectAccessible(page);
    await page.fill('#email', 'nobody@example.org');
    await page.fill('#password', 'nothing');
    await page.keyboard.press('Enter');
    await page.waitForSelector('[role=alert]');
    await expectAccessible(page);
    expect(await page.inputValue('#email')).toBe('nobody@example.org');
    await context.close();
    const coder = await enter('coder', '/people');
    expect(await coder.textContent('h1')).toBe('Not for this role');
    await expectAccessible(coder);
    await coder.goto(`${server.url}/nowhere`);
    expect(await coder.textContent('h1')).toBe('Not found');
    await coder.context().close();
  });
});

describe('the theatre list', () => {
  it('takes a case by hand, and says beside the field what is wrong with it', async () => {
    const page = await enter('secretary', '/');
    await page.fill('#field-family-name', '<script>alert(1)</script>');
    await page.fill('#field-given-name', 'Wren');
    await page.fill('#field-record-number', 'DEMO-30001');
    await page.fill('#field-date-of-birth', '1970-02-31');
    await page.click('text=Add to the list');
    expect(await page.textContent('#field-date-of-birth-error')).toBe('There is no such day in the calendar');
    expect(await page.textContent('#eye-error')).toBe('Missing');
    expect(await page.inputValue('#field-record-number')).toBe('DEMO-30001');
    await page.fill('#field-date-of-birth', '1970-02-28');
    await page.check('input[name=eye][value=left]');
    await page.click('text=Add to the list');
    await page.waitForSelector('text=1 case added.');
    expect(await page.textContent('tbody')).toContain('<script>alert(1)</script>, Wren');
    await page.context().close();
  });

  it('shows an uploaded list before anything is added', async () => {
    const page = await enter('secretary', '/');
    const head = 'date,position,record number,family name,given name,date of birth,eye';
    const csv = [
      head,
      '2026-12-24,1,DEMO-40001,Farrow,Ivo,1955-05-05,right',
      '2026-12-24,2,DEMO-40002,Farrow,Ada,1955-05-05,both',
    ].join('\n');
    await page.setInputFiles('#file', { name: 'list.csv', mimeType: 'text/csv', buffer: Buffer.from(csv) });
    await page.click('text=Look before adding');
    expect(await page.textContent('caption')).toContain('1 of 2 lines can be added');
    expect(await page.textContent('[aria-label="Upload a list"] .error')).toContain('Write right or left');
    await page.click('text=Add 1 case');
    await page.waitForSelector('text=1 case added.');
    expect(await page.textContent('h1')).toBe('Theatre list, 24 December 2026');
    expect(await page.textContent('tbody')).toContain('Farrow, Ivo');
    await page.context().close();
  });
});

describe('a letter', () => {
  it('shows what the signed note denies, goes out once mended, and says that it has gone', async () => {
    const page = await enter('secretary', '/letters');
    await page.click('text=Letter to the referring doctor');
    const send = page.getByRole('button', { name: 'Send', exact: true });
    await page.waitForSelector('text=named in the signed note as referring doctor');
    const words = page.locator('textarea').nth(2);
    const drafted = await words.inputValue();
    await words.fill('Surgery to the right eye.');
    await page.waitForSelector('text=the signed note says left eye');
    await page.getByLabel(/Fern Mossgrove/).check();
    expect(await page.textContent('#in-the-way')).toContain('otherwise than the signed note');
    expect(await send.isDisabled()).toBe(true);
    await words.fill(drafted);
    await page.waitForSelector('text=saved');
    await send.click();
    await page.waitForSelector('aside .notice-good', { timeout: 20_000 });
    expect(server.messages()).toHaveLength(1);
    await page.context().close();
  });
});
