import { request as httpRequest } from 'node:http';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createTestDatabase, type TestDatabase } from '../support/database.ts';
import { startServer, type TestServer } from '../support/server.ts';

let database: TestDatabase;
let server: TestServer;

beforeAll(async () => {
  database = await createTestDatabase();
  server = await startServer({ database, instances: 2 });
});

afterAll(async () => {
  await server?.stop();
  await database?.drop();
});

/** A request as a browser would not send it. */
const raw = (path: string, headers: Record<string, string>): Promise<number | undefined> =>
  new Promise((resolve, reject) => {
    const { hostname, port } = new URL(server.url);
    httpRequest({ hostname, port, path, headers, agent: false }, (reply) => {
      reply.resume();
      reply.on('end', () => resolve(reply.statusCode));
    })
      .on('error', reject)
      .end();
  });

describe('the server around the built application', () => {
  it('answers its health path on every instance', async () => {
    expect(server.urls).toHaveLength(2);
    for (const url of server.urls) {
      const reply = await fetch(`${url}/healthz`);
      expect([reply.status, await reply.text()]).toEqual([200, 'ok\n']);
    }
  });

  it('puts the security headers on what is there and on what is not', async () => {
    for (const path of ['/', '/api/nothing-here', '/icon.svg', '/_astro/nothing-here.js']) {
      const { headers } = await fetch(`${server.url}${path}`, { redirect: 'manual' });
      expect(headers.get('x-content-type-options')).toBe('nosniff');
      expect(headers.get('x-frame-options')).toBe('DENY');
      expect(headers.get('content-security-policy')).toContain("frame-ancestors 'none'");
      expect(headers.get('cache-control')).not.toContain('immutable');
    }
  });

  it('serves static files with their type, and nothing from outside their folder', async () => {
    const icon = await fetch(`${server.url}/icon.svg`);
    expect([icon.status, icon.headers.get('content-type')]).toEqual([200, 'image/svg+xml']);
    const { host } = new URL(server.url);
    for (const path of ['/../../package.json', '/..%2f..%2fpackage.json', '/%2e%2e/%2e%2e/package.json']) {
      expect(await raw(path, { host })).not.toBe(200);
    }
  });

  it('answers to its own names only', async () => {
    const { port } = new URL(server.url);
    expect(await raw('/healthz', { host: 'elsewhere.example' })).toBe(200);
    expect(await raw('/', { host: 'elsewhere.example' })).toBe(400);
    expect(await raw('/icon.svg', { host: `localhost:${port}` })).toBe(200);
  });

  it('refuses a change that comes from another site, or from nowhere', async () => {
    const post = async (headers: Record<string, string>) =>
      (await fetch(`${server.url}/api/nothing-here`, { method: 'POST', headers, body: '{}' })).status;
    expect(await post({ origin: 'https://elsewhere.example' })).toBe(403);
    expect(await post({})).toBe(403);
    expect(await post({ origin: server.url })).not.toBe(403);
  });

  it('refuses a body of more than 2 MiB', async () => {
    const reply = await fetch(`${server.url}/api/nothing-here`, {
      method: 'POST',
      headers: { origin: server.url },
      body: new Uint8Array(2 * 1024 * 1024 + 1),
    });
    expect(reply.status).toBe(413);
    expect(await reply.json()).toMatchObject({ code: 'http-413' });
  });
});
