import { readFileSync } from 'node:fs';
import pg from 'pg';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { CaseRecord } from '../../src/domain/record/schema.ts';
import { expectAccessible, launchBrowser, watchComplaints } from '../support/browser.ts';
import { createTestDatabase, type TestDatabase } from '../support/database.ts';
import { startServer, type TestServer } from '../support/server.ts';

let database: TestDatabase;
let server: TestServer;
let browser: Browser;
let db: pg.Client;

beforeAll(async () => {
  database = await createTestDatabase({ demonstration: true });
  server = await startServer({ database });
  browser = await launchBrowser();
  db = new pg.Client({ connectionString: database.url });
  await db.connect();
});

afterAll(async () => {
  await browser?.close();
  await db?.end();
  await server?.stop();
  await database?.drop();
});

/** A record put in place of that of the case at a position of the list; answers the id of the case. */
const caseWith = async (position: number, record: CaseRecord): Promise<string> => {
  const { rows } = await db.query<{ id: string }>(
    'select id from cases order by position, id offset $1 limit 1',
    [position],
  );
  const id = rows[0]?.id ?? '';
  await db.query('update cases set record = $2, sheet = null, answers = $3 where id = $1', [
    id,
    record,
    '[]',
  ]);
  return id;
};

const patient = {
  familyName: 'Quillfeather',
  givenName: 'Ysolde',
  dateOfBirth: '1954-11-23',
  number: 'DEMO-20419',
};

const open = async (id: string): Promise<Page> => {
  const context = await browser.newContext({ viewport: { width: 1440, height: 900 } });
  const page = await context.newPage();
  await page.goto(`${server.url}/sign-in?next=/cases/${id}`);
  await page.fill('#email', 'surgeon@example.org');
  await page.fill('#password', 'demonstration-surgeon');
  await page.keyboard.press('Enter');
  await ready(page);
  return page;
};

const ready = (page: Page) => page.locator('.sheet [role="textbox"]').waitFor();

const saved = (page: Page) =>
  page.locator('.patient-save[data-save="saved"]', { hasNotText: 'revision 1 ' }).waitFor();

const press = async (page: Page, ...keys: string[]) => {
  for (const key of keys) await page.keyboard.press(key);
};

const focused = (page: Page, path: string) =>
  page.waitForFunction((id) => document.activeElement?.closest(`[id="${id}"]`) !== null, path);

describe('recording a case by keyboard alone', () => {
  it('drafts the note, keeps it without being asked, and shows it again', async () => {
    const id = await caseWith(0, { version: 1, who: { patient, eye: 'right' } });
    const page = await open(id);
    const complaints = watchComplaints(page);

    await press(page, '2');
    await focused(page, 'before.diagnosis');
    await page.keyboard.type('rhegm');
    await press(page, 'Enter', 'o', 'o', 'Enter');
    await focused(page, 'before.maculaOffDays');
    await page.keyboard.type('3');
    await press(page, 'Enter');
    await page.keyboard.type('10');
    await press(page, 'Enter');
    await page.keyboard.type('1:30');

    await press(page, 'Alt+4');
    await focused(page, 'breaks.found');
    await press(page, 'Tab', 'Enter');
    await focused(page, 'breaks.found.0.kind');
    await page.keyboard.type('horse');
    await press(page, 'Enter');
    await page.keyboard.type('11:30');

    const words = page.locator('.sheet');
    await expect.poll(() => words.textContent()).toContain('right rhegmatogenous retinal detachment');
    await expect.poll(() => words.textContent()).toMatch(/horseshoe tear .*11:30/);
    await saved(page);
    await page.reload();
    await ready(page);
    await expect.poll(() => words.textContent()).toMatch(/horseshoe tear .*11:30/);
    expect(complaints).toEqual([]);
    await page.context().close();
  });

  it('keeps what cannot be read in its box, and saves nothing of it', async () => {
    const id = await caseWith(0, { version: 1, who: { patient, eye: 'right' } });
    const page = await open(id);
    await press(page, '2');
    await page.fill('[id="before.maculaOffDays"]', 'three');
    await press(page, 'Tab', 'Alt+3', 'Alt+2');
    expect(await page.inputValue('[id="before.maculaOffDays"]')).toBe('three');
    expect(await page.textContent('.bottom-sign')).toContain('1 entry cannot be read');
    await page.context().close();
  });
});

describe('flags', () => {
  it('come with what they are about and go with its correction', async () => {
    const id = await caseWith(1, { version: 1, who: { patient, eye: 'right', consentEye: 'right' } });
    const page = await open(id);
    await press(page, '1');
    await focused(page, 'who.eye');
    await press(page, 'Enter', 'l');
    const note = page.locator('.note-contradiction');
    await note.first().waitFor();
    expect(await page.getAttribute('[data-path="who.consentEye"]', 'data-level')).toBe('contradiction');
    expect(await page.textContent('.bottom-sign')).toMatch(/^Sign: .*contradiction/);
    await press(page, 'Escape', 'n');
    await page.waitForFunction(
      () => document.activeElement?.closest('[data-level="contradiction"]') !== null,
    );
    await press(page, 'Alt+w');
    await page.locator('.note-why').waitFor();
    await page.locator('[id="who.consentEye=right"]').check();
    await note.first().waitFor({ state: 'detached' });
    await page.context().close();
  });
});

describe('the sheet', () => {
  it('keeps an edit over a reload, and lays both wordings side by side when its facts change', async () => {
    const id = await caseWith(2, {
      version: 1,
      who: { patient, eye: 'right' },
      before: { diagnosis: 'rhegmatogenous', macula: 'off' },
    });
    const page = await open(id);
    const statement = page.locator('.statement', { hasText: 'rhegmatogenous' }).first();
    await statement.click();
    await press(page, 'End');
    await page.keyboard.type(' Seen by two surgeons.');
    await saved(page);
    await page.reload();
    await ready(page);
    const edited = page.locator('.statement[data-origin="edited"]', { hasText: 'Seen by two surgeons.' });
    await edited.waitFor();

    await press(page, '2');
    await page.locator('[id="before.macula=on"]').check();
    await page.locator('.note-parted').waitFor();
    expect(await page.textContent('.sheet')).toContain('Seen by two surgeons.');
    await press(page, 'Alt+t');
    await expect.poll(() => page.textContent('.sheet')).not.toContain('Seen by two surgeons.');
    expect(await page.textContent('.sheet')).toContain('macula on');
    await page.context().close();
  });

  it('starts a statement of one’s own with Enter, and keeps it over a reload', async () => {
    const id = await caseWith(2, {
      version: 1,
      who: { patient, eye: 'right' },
      before: { diagnosis: 'rhegmatogenous', macula: 'off' },
    });
    const page = await open(id);
    await page.locator('.statement', { hasText: 'rhegmatogenous' }).first().click();
    await press(page, 'End', 'Enter');
    await page.keyboard.type('The patient asked for a copy.');
    const own = page.locator('.statement[data-origin="own"]');
    await expect.poll(() => own.textContent()).toContain('The patient asked for a copy.');
    await saved(page);
    await page.reload();
    await ready(page);
    await expect.poll(() => own.textContent()).toContain('The patient asked for a copy.');
    await page.context().close();
  });
});

describe('a version that somebody else saved', () => {
  it('is offered beside one’s own, and neither is lost', async () => {
    const id = await caseWith(3, { version: 1, who: { patient, eye: 'right' } });
    const mine = await open(id);
    const theirs = await open(id);
    await press(theirs, '2');
    await theirs.locator('[id="before.macula=on"]').check();
    await saved(theirs);

    await press(mine, '2');
    await mine.locator('[id="before.macula=off"]').check();
    await mine.getByText('This case was saved elsewhere').waitFor();
    await mine.getByText('See the differences').click();
    await mine.getByRole('cell', { name: 'off', exact: true }).waitFor();
    await press(mine, 'Escape');
    await mine.getByText('Keep mine').click();
    await saved(mine);
    await theirs.reload();
    await ready(theirs);
    await press(theirs, '2');
    expect(await theirs.locator('[id="before.macula=off"]').isChecked()).toBe(true);
    await mine.context().close();
    await theirs.context().close();
  });
});

describe('signing', () => {
  it('asks for the password, says what it means, and leaves a signed note that is only read', async () => {
    const record: CaseRecord = JSON.parse(
      readFileSync(new URL('../fixtures/vitrectomy-with-gas.json', import.meta.url), 'utf8'),
    );
    const page = await open(await caseWith(4, record));
    await press(page, 'x');
    const password = page.locator('input[type="password"]');
    await password.fill('not-this-one');
    await press(page, 'Enter');
    await page.locator('dialog [role="alert"]').waitFor();
    await password.fill('demonstration-surgeon');
    await press(page, 'Enter');
    await page.getByText('Verification code').waitFor();
    expect(await page.locator('.sheet [role="textbox"]').count()).toBe(0);
    await page.reload();
    await page.getByText('Verification code').waitFor();
    const link = await page.getByText('Document (DOCX)').getAttribute('href');
    const document = await page.request.get(`${server.url}${link}`);
    expect(document.status()).toBe(200);
    await page.context().close();
  });
});

describe('for everybody', () => {
  it('is accessible at each stage, on a wide screen and on a phone', async () => {
    const record: CaseRecord = JSON.parse(
      readFileSync(new URL('../fixtures/vitrectomy-band-and-oil.json', import.meta.url), 'utf8'),
    );
    const page = await open(await caseWith(0, record));
    const complaints = watchComplaints(page);
    for (let key = 1; key <= 9; key += 1) {
      await press(page, `Alt+${key}`);
      await expectAccessible(page);
    }
    await press(page, 'Alt+/');
    await page.getByRole('heading', { name: 'Keys' }).waitFor();
    await expectAccessible(page);
    await press(page, 'Escape');
    await page.setViewportSize({ width: 390, height: 844 });
    for (const view of ['Record', 'Sheet', 'Margin']) {
      await page.getByRole('button', { name: view, exact: true }).click();
      await expectAccessible(page);
    }
    expect(complaints).toEqual([]);
    await page.context().close();
  });
});
