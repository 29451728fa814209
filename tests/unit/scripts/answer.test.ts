import { createServer, request as httpRequest, type IncomingMessage } from 'node:http';
import type { AddressInfo } from 'node:net';
import { Readable } from 'node:stream';
import { brotliDecompressSync, gunzipSync } from 'node:zlib';
import { afterEach, describe, expect, it } from 'vitest';
import { Answer } from '../../../scripts/lib/http/answer.mjs';
import { readBody } from '../../../scripts/lib/http/body.mjs';

let close = () => {};
afterEach(() => close());

interface Reply {
  status: number | undefined;
  headers: IncomingMessage['headers'];
  body: Buffer;
}

const ask = async (
  handle: (request: IncomingMessage, answer: Answer) => void,
  options: { path?: string; method?: string; headers?: Record<string, string>; body?: Readable } = {},
): Promise<Reply> => {
  const server = createServer({ ServerResponse: Answer }, handle);
  close = () => server.close();
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const { port } = server.address() as AddressInfo;
  return new Promise((resolve, reject) => {
    const { body, ...rest } = options;
    const request = httpRequest({ host: '127.0.0.1', port, agent: false, ...rest }, (reply) => {
      const parts: Buffer[] = [];
      reply.on('data', (part: Buffer) => parts.push(part));
      reply.on('end', () =>
        resolve({ status: reply.statusCode, headers: reply.headers, body: Buffer.concat(parts) }),
      );
    });
    request.on('error', reject);
    if (body === undefined) request.end();
    else body.pipe(request);
  });
};

const long = 'a word or two '.repeat(5000);

const html = (text: string) => (_: IncomingMessage, answer: Answer) => {
  answer.writeHead(200, { 'content-type': 'text/html' });
  answer.end(text);
};

describe('an answer', () => {
  it('carries the security headers, beside a policy of its own', async () => {
    const { headers } = await ask((_, answer) => {
      answer.writeHead(200, { 'content-type': 'text/html', 'content-security-policy': "script-src 'self'" });
      answer.end('x');
    });
    expect(headers).toMatchObject({
      'x-content-type-options': 'nosniff',
      'x-frame-options': 'DENY',
      'referrer-policy': 'same-origin',
      'cross-origin-opener-policy': 'same-origin',
      'cache-control': 'no-store',
    });
    expect(headers['content-security-policy']).toBe(
      "script-src 'self', frame-ancestors 'none'; base-uri 'self'; form-action 'self'",
    );
    expect(headers['permissions-policy']).toContain('camera=()');
  });

  it.each([
    ['br', brotliDecompressSync],
    ['gzip', gunzipSync],
  ] as const)('is compressed with %s when it is long', async (encoding, open) => {
    const { headers, body } = await ask(html(long), { headers: { 'accept-encoding': encoding } });
    expect(headers['content-encoding']).toBe(encoding);
    expect(headers.vary).toBe('Accept-Encoding');
    expect(open(body).toString()).toBe(long);
  });

  it.each(['', 'identity', 'br;q=0, gzip;q=0.0'])('is left alone for "%s"', async (accepted) => {
    const { headers, body } = await ask(html(long), { headers: { 'accept-encoding': accepted } });
    expect(headers['content-encoding']).toBeUndefined();
    expect(body.toString()).toBe(long);
  });

  it('is left alone when it is short, a picture, a part or already compressed', async () => {
    const answers: [number, string, string, Record<string, string>][] = [
      [200, 'text/html', 'short', {}],
      [200, 'image/png', long, {}],
      [206, 'text/plain', long, { 'content-range': 'bytes 0-9/10' }],
      [200, 'text/plain', long, { 'content-encoding': 'zstd' }],
    ];
    for (const [status, type, text, more] of answers) {
      const { headers, body } = await ask(
        (_, answer) => {
          answer.writeHead(status, { 'content-type': type, ...more });
          answer.end(text);
        },
        { headers: { 'accept-encoding': 'br' } },
      );
      close();
      expect(headers['content-encoding']).not.toBe('br');
      expect(body.length).toBe(Buffer.byteLength(text));
    }
  });

  it('survives a stream that is larger than every buffer', async () => {
    const parts = Array.from({ length: 200 }, (_, at) => `${at} ${long}`);
    const { body } = await ask(
      (_, answer) => {
        answer.setHeader('Content-Type', 'text/plain');
        Readable.from(parts).pipe(answer);
      },
      { headers: { 'accept-encoding': 'gzip' } },
    );
    expect(gunzipSync(body).toString()).toBe(parts.join(''));
  });

  it('is a page or a JSON failure where the application sent an error without a body', async () => {
    const empty = (_: IncomingMessage, answer: Answer) => {
      answer.writeHead(500, {});
      answer.end();
    };
    const page = await ask(empty);
    close();
    expect(page.status).toBe(500);
    expect(page.headers['content-type']).toBe('text/html; charset=utf-8');
    expect(page.body.toString()).toContain('Something went wrong on the server');
    const json = await ask(empty, { path: '/api/cases' });
    expect(JSON.parse(json.body.toString())).toMatchObject({ code: 'http-500' });
  });

  it('keeps an empty answer empty', async () => {
    const { status, headers, body } = await ask((_, answer) => {
      answer.writeHead(303, { location: '/' });
      answer.end();
    });
    expect([status, headers.location, headers['content-length'], body.length]).toEqual([303, '/', '0', 0]);
  });
});

describe('a body', () => {
  const measure = (request: IncomingMessage, answer: Answer) => {
    readBody(request, 1000).then((body) => {
      answer.setHeader('Content-Type', 'text/plain');
      answer.setHeader('Connection', 'close');
      answer.end(body === undefined ? 'too large' : String(body.length));
    });
  };
  const send = async (sizes: number[], headers: Record<string, string> = {}) => {
    const body = Readable.from(sizes.map((size) => Buffer.alloc(size)));
    return (await ask(measure, { method: 'POST', headers, body })).body.toString();
  };

  it('is read whole up to the limit, chunked or announced', async () => {
    expect(await send([500, 500])).toBe('1000');
    close();
    expect(await send([1000], { 'content-length': '1000' })).toBe('1000');
  });

  it('is refused beyond the limit, chunked or announced', async () => {
    expect(await send([500, 501])).toBe('too large');
    close();
    expect(await send([1001], { 'content-length': '1001' })).toBe('too large');
  });
});
