import { readdirSync } from 'node:fs';
import pg from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type Action, may, type Role, roles } from '../../src/domain/access/policy.ts';
import { createTestDatabase, type TestDatabase } from '../support/database.ts';
import { type Person, signInAs } from '../support/person.ts';
import { startServer, type TestServer } from '../support/server.ts';

let database: TestDatabase;
let server: TestServer;
let caseId: string;
const people = new Map<Role, Person>();

beforeAll(async () => {
  database = await createTestDatabase({ demonstration: true });
  server = await startServer({ database });
  const client = new pg.Client({ connectionString: database.ownerUrl });
  await client.connect();
  const { rows } = await client.query('select id from cases where position = 1');
  caseId = rows[0].id;
  await client.end();
  for (const role of roles) people.set(role, await signInAs(server.url, role));
});

afterAll(async () => {
  await server?.stop();
  await database?.drop();
});

const unknown = '00000000-0000-4000-8000-000000000000';

/** Every page and route with the action that it stands for. */
const places: readonly { method: string; path: () => string; action: Action }[] = [
  { method: 'GET', path: () => '/letters', action: 'letters:list' },
  { method: 'GET', path: () => `/letters/${unknown}`, action: 'letter:read' },
  { method: 'GET', path: () => '/coding', action: 'codes:list' },
  { method: 'GET', path: () => `/coding/${unknown}`, action: 'codes:read' },
  { method: 'GET', path: () => '/auditing', action: 'audit:list' },
  { method: 'GET', path: () => `/auditing/${unknown}`, action: 'signed:verify' },
  { method: 'GET', path: () => `/signed/${unknown}`, action: 'signed:read' },
  { method: 'GET', path: () => '/recipients', action: 'recipients:read' },
  { method: 'GET', path: () => '/people', action: 'people:change' },
  { method: 'GET', path: () => '/unit', action: 'unit:change' },
  { method: 'GET', path: () => '/unit/checks', action: 'unit:change' },
  { method: 'GET', path: () => '/handbook', action: 'handbook:read' },
  { method: 'GET', path: () => `/cases/${caseId}`, action: 'case:list-own' },
  { method: 'GET', path: () => `/cases/${caseId}/history`, action: 'case:list-own' },
  { method: 'GET', path: () => `/api/cases/${caseId}`, action: 'case:list-own' },
  { method: 'PUT', path: () => `/api/cases/${caseId}`, action: 'case:write' },
  { method: 'POST', path: () => `/api/cases/${caseId}/sign`, action: 'case:sign' },
  { method: 'GET', path: () => `/api/cases/${caseId}/draft.docx`, action: 'case:read-draft' },
  { method: 'GET', path: () => `/api/signed/${unknown}/note.docx`, action: 'signed:read' },
  { method: 'GET', path: () => `/api/signed/${unknown}/proof.json`, action: 'signed:verify' },
  { method: 'GET', path: () => `/api/letters/${unknown}`, action: 'letter:read' },
  { method: 'PUT', path: () => `/api/letters/${unknown}`, action: 'letter:write' },
  { method: 'POST', path: () => `/api/letters/${unknown}/send`, action: 'letter:send' },
  { method: 'GET', path: () => `/api/letters/${unknown}/letter.docx`, action: 'letter:read' },
  { method: 'GET', path: () => '/api/coding/export.csv', action: 'codes:export' },
];

/** Files under src/pages that anybody may open, or that send everybody to their own desk. */
const open = ['403.astro', '404.astro', 'index.astro', 'sign-in.astro', 'sign-out.ts'];

const fileOf = (path: string): string => {
  const parts = path.slice(1).replaceAll(caseId, '[id]').replaceAll(unknown, '[id]');
  return parts.startsWith('api/') ? `${parts}.ts` : `${parts}.astro`;
};

it('tries every page and route that there is', () => {
  const files = readdirSync(new URL('../../src/pages', import.meta.url), {
    recursive: true,
    withFileTypes: true,
  })
    .filter((entry) => entry.isFile())
    .map((entry) => `${entry.parentPath}/${entry.name}`.split('/src/pages/')[1] ?? '')
    .map((file) => file.replace('/index.', '.'));
  const tried = new Set([...open, ...places.map(({ path }) => fileOf(path()))]);
  expect(files.filter((file) => !tried.has(file))).toEqual([]);
});

describe.each(roles)('%s', (role) => {
  it('goes where the policy table lets them, and nowhere else', async () => {
    const person = people.get(role);
    for (const { method, path, action } of places) {
      const answer = await (method === 'GET' ? person?.get(path()) : person?.send(method, path(), {}, 1));
      const isRefused = answer?.status === 403;
      expect({ path: path(), isRefused }).toEqual({ path: path(), isRefused: !may([role], action) });
    }
  });
});

describe('a visitor', () => {
  it('is sent to sign in, and told so by the API', async () => {
    for (const { method, path } of places) {
      const answer = await fetch(server.url + path(), {
        method,
        redirect: 'manual',
        headers: { origin: server.url, 'content-type': 'application/json' },
        ...(method === 'GET' ? {} : { body: '{}' }),
      });
      expect([path(), answer.status]).toEqual([path(), path().startsWith('/api/') ? 401 : 302]);
    }
  });

  it('gets the same answer for an unknown person and a wrong password, and is stopped after eight attempts', async () => {
    const attempt = async (email: string) => {
      const answer = await fetch(`${server.url}/sign-in`, {
        method: 'POST',
        headers: { origin: server.url },
        body: new URLSearchParams({ email, password: 'not the password' }),
      });
      const page = (await answer.text()).replaceAll(email, '');
      // The demonstration's accounts are listed below the form.
      return { status: answer.status, body: page.slice(0, page.indexOf('<section')) };
    };
    const known = await attempt('coder@example.org');
    const unknownPerson = await attempt('nobody@example.org');
    expect(known).toEqual(unknownPerson);
    expect(known.status).toBe(401);
    let last = known.status;
    for (let tries = 0; tries < 9; tries += 1) last = (await attempt('coder@example.org')).status;
    expect(last).toBe(429);
  });
});

describe('signing out', () => {
  it('ends the session on the server', async () => {
    const person = await signInAs(server.url, 'fellow');
    expect((await person.get('/handbook')).status).toBe(200);
    expect((await person.post('/sign-out', {})).status).toBe(303);
    expect((await person.get('/handbook')).status).toBe(302);
  });
});

describe('a session', () => {
  it('ends when it was idle or has lasted too long', async () => {
    const client = new pg.Client({ connectionString: database.ownerUrl });
    await client.connect();
    for (const change of [
      "expires_at = now() - interval '1 second'",
      "created_at = now() - interval '13 hours'",
    ]) {
      const person = await signInAs(server.url, 'fellow');
      expect((await person.get('/handbook')).status).toBe(200);
      await client.query(
        `update sessions set ${change} where user_id = (select id from people where email = 'fellow@example.org')`,
      );
      expect((await person.get('/handbook')).status).toBe(302);
    }
    await client.end();
  });

  it('is kept only as the hash of its token', async () => {
    const client = new pg.Client({ connectionString: database.ownerUrl });
    await client.connect();
    await signInAs(server.url, 'fellow');
    const { rows } = await client.query('select id from sessions');
    await client.end();
    for (const { id } of rows) expect(id).toMatch(/^[0-9a-f]{64}$/);
  });
});

describe('being kept out', () => {
  it('ends every session at once', async () => {
    const fellow = await signInAs(server.url, 'fellow');
    const client = new pg.Client({ connectionString: database.ownerUrl });
    await client.connect();
    const { rows } = await client.query("select id from people where email = 'fellow@example.org'");
    await client.end();
    await people.get('administrator')?.post('/people', { form: 'active', id: rows[0].id, active: 'no' });
    expect((await fellow.get('/handbook')).status).toBe(302);
    await expect(signInAs(server.url, 'fellow')).rejects.toThrow('401');
  });
});
