import pg from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createTestDatabase, type TestDatabase } from '../support/database.ts';
import { type Person, signInAs } from '../support/person.ts';
import { startServer, type TestServer } from '../support/server.ts';

let database: TestDatabase;
let server: TestServer;
let owner: pg.Client;
let caseId: string;
let surgeon: Person;
let administrator: Person;

const attempt = (email: string, password: string, next = ''): Promise<Response> =>
  fetch(`${server.url}/sign-in${next === '' ? '' : `?next=${encodeURIComponent(next)}`}`, {
    method: 'POST',
    headers: { origin: server.url },
    body: new URLSearchParams({ email, password }),
    redirect: 'manual',
  });

const sign = (password: string) =>
  surgeon.send('POST', `/api/cases/${caseId}/sign`, { password, meaning: 'author' }, 1);

const personId = async (email: string): Promise<string> => {
  const { rows } = await owner.query('select id from people where email = $1', [email]);
  return rows[0].id;
};

beforeAll(async () => {
  database = await createTestDatabase({ demonstration: true });
  server = await startServer({ database });
  owner = new pg.Client({ connectionString: database.ownerUrl });
  await owner.connect();
  const { rows } = await owner.query('select id from cases where position = 1');
  caseId = rows[0].id;
  surgeon = await signInAs(server.url, 'surgeon');
  administrator = await signInAs(server.url, 'administrator');
});

afterAll(async () => {
  await owner?.end();
  await server?.stop();
  await database?.drop();
});

describe('signing in', () => {
  it('goes back to the wanted page, and to no other site', async () => {
    const goesTo = async (next: string) =>
      (await attempt('fellow@example.org', 'demonstration-fellow', next)).headers.get('location');
    expect(await goesTo('/handbook')).toBe('/handbook');
    for (const elsewhere of [
      '//x.example.org',
      '/\t/x.example.org',
      '/.//x.example.org',
      'https://x.example.org',
    ]) {
      expect(await goesTo(elsewhere)).toBe('/');
    }
  });

  it('keeps the e-mail address that was typed, whatever was typed', async () => {
    const refused = await attempt('nobody\u0000@example.org', 'x');
    expect(refused.status).toBe(401);
    expect(await (await attempt('nobody@example.org', 'x')).text()).toContain('value="nobody@example.org"');
  });

  it('takes the place of whoever was there, and clears away sessions that have ended', async () => {
    const before = await signInAs(server.url, 'fellow');
    const { rows } = await owner.query(
      "update sessions set expires_at = now() - interval '1 day' where user_id = $1 returning id",
      [await personId('administrator@example.org')],
    );
    const again = await before.post('/sign-in', {
      email: 'coder@example.org',
      password: 'demonstration-coder',
    });
    expect(again.status).toBe(303);
    expect((await before.get('/handbook')).status).toBe(302);
    const ended = await owner.query('select from sessions where id = any($1)', [rows.map(({ id }) => id)]);
    expect(ended.rows).toEqual([]);
    administrator = await signInAs(server.url, 'administrator');
  });

  it('that fits uses up no attempt of a place that many share', async () => {
    const used = async () => {
      const { rows } = await owner.query("select points from rate_limits where key like 'place:%'");
      return rows[0].points;
    };
    const before = await used();
    await signInAs(server.url, 'secretary');
    await signInAs(server.url, 'secretary');
    expect(await used()).toBe(before);
  });
});

describe('a stranger who tries an account', () => {
  it('cannot keep its owner, who is signed in, from signing', async () => {
    for (let tries = 0; tries < 9; tries += 1) await attempt('surgeon@example.org', 'wrong');
    expect((await attempt('surgeon@example.org', 'demonstration-surgeon')).status).toBe(429);
    expect((await sign('wrong')).status).toBe(401);
    // The case is half-done: the password is taken, the flags are in the way.
    expect((await sign('demonstration-surgeon')).status).toBe(409);
  });
});

describe('an open screen', () => {
  it('does not let a password be guessed at the signature', async () => {
    const statuses: number[] = [];
    for (let tries = 0; tries < 9; tries += 1) statuses.push((await sign('wrong')).status);
    expect(statuses).toEqual([...Array.from({ length: 8 }, () => 401), 429]);
    expect((await sign('demonstration-surgeon')).status).toBe(429);
  });
});

describe('a new password', () => {
  it('ends the sessions, lets the person in at once, and the old one no more', async () => {
    const id = await personId('surgeon@example.org');
    const password = 'another password';
    expect((await administrator.post('/people', { form: 'password', id, password })).status).toBe(303);
    expect((await surgeon.get('/')).status).toBe(302);
    expect((await attempt('surgeon@example.org', 'demonstration-surgeon')).status).toBe(401);
    expect((await attempt('surgeon@example.org', password)).status).toBe(303);
  });

  it('for nobody is refused, not an error', async () => {
    const sent = { form: 'password', id: 'nobody', password: 'another password' };
    expect((await administrator.post('/people', sent)).status).toBe(422);
  });
});

describe('a request', () => {
  it('has a number that is in the answer and in the log', async () => {
    const answer = await administrator.get('/people');
    const request = answer.headers.get('x-request-id') ?? 'none';
    expect(request).toMatch(/^[0-9a-f-]{36}$/);
    const line = server
      .output()
      .split('\n')
      .find((one) => one.includes(request));
    expect(line).toMatch(/"method":"GET","route":"\/people","status":200,"ms":\d+/);
  });

  it('with a character that cannot be kept is refused with its place, not with an error', async () => {
    const fellow = await signInAs(server.url, 'fellow');
    const record = { version: 1, who: { theatre: 'a\u0000b' } };
    const body = { record, sheet: { title: 'Operative note', sections: [] }, answers: [] };
    const refused = await fellow.send('PUT', `/api/cases/${caseId}`, body, 1);
    expect(refused.status).toBe(422);
    expect(await refused.json()).toMatchObject({ code: 'invalid', issues: [{ path: 'record.who.theatre' }] });
  });
});

describe('a page that is not for a role', () => {
  it('says so, and what is', async () => {
    const coder = await signInAs(server.url, 'coder');
    const refused = await coder.get('/people');
    expect(refused.status).toBe(403);
    const page = await refused.text();
    expect(page).toContain('D. Coder');
    expect(page).toMatch(/<a href="\/coding"[^>]*>Coding<\/a>/);
    expect(page).not.toContain('href="/people"');
  });
});
