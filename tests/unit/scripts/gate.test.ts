import { describe, expect, it } from 'vitest';
import { addressesOf, dropForwarded, refusalOf } from '../../../scripts/lib/http/gate.mjs';

const addresses = addressesOf('https://notes.example.org', 4321);

const status = (method: string, url: string, headers: Record<string, string>) =>
  refusalOf({ method, url, headers }, addresses)?.status;

describe('the gate', () => {
  it.each([
    'notes.example.org',
    'NOTES.example.org',
    'notes.example.org:443',
    '127.0.0.1:4321',
    'localhost:4321',
  ])('knows the host %s', (host) => {
    expect(status('GET', '/', { host })).toBeUndefined();
  });

  it.each(['', 'elsewhere.example', 'notes.example.org.elsewhere.example', '127.0.0.1', 'localhost:4322'])(
    'refuses the host "%s"',
    (host) => {
      expect(status('GET', '/', { host })).toBe(400);
    },
  );

  it('refuses targets that would be read as another host', () => {
    const host = 'notes.example.org';
    for (const url of [
      'http://elsewhere.example/',
      '//elsewhere.example/',
      '/\\elsewhere.example',
      '*',
      '',
    ]) {
      expect(status('GET', url, { host })).toBe(400);
    }
  });

  it.each(['TRACE', 'OPTIONS', 'CONNECT', 'PROPFIND'])('refuses the method %s', (method) => {
    expect(status(method, '/', { host: 'notes.example.org' })).toBe(405);
  });

  it.each(['POST', 'PUT', 'PATCH', 'DELETE'])(
    'lets %s through from a page of the same host only',
    (method) => {
      const host = 'notes.example.org';
      const from = (headers: Record<string, string>) => status(method, '/api/x', { host, ...headers });
      expect(from({ origin: 'https://notes.example.org' })).toBeUndefined();
      expect(from({ 'sec-fetch-site': 'same-origin' })).toBeUndefined();
      expect(from({})).toBe(403);
      expect(from({ origin: 'null' })).toBe(403);
      expect(from({ origin: 'https://elsewhere.example' })).toBe(403);
      expect(from({ origin: 'http://notes.example.org' })).toBe(403);
      expect(from({ origin: 'http://localhost:4321' })).toBe(403);
      expect(from({ 'sec-fetch-site': 'same-site' })).toBe(403);
      expect(from({ origin: 'https://elsewhere.example', 'sec-fetch-site': 'same-origin' })).toBe(403);
    },
  );

  it('throws forwarded headers away', () => {
    const headers = {
      host: 'notes.example.org',
      forwarded: 'for=1.2.3.4',
      'x-forwarded-for': '1.2.3.4',
      'x-forwarded-host': 'elsewhere.example',
      'x-forwarded-proto': 'https',
      'x-real-ip': '1.2.3.4',
    };
    dropForwarded(headers, 0);
    expect(headers).toEqual({ host: 'notes.example.org' });
  });

  it('keeps what the outermost of its own proxies has seen', () => {
    const seenBy = (proxies: number) => {
      const headers = { 'x-forwarded-for': 'forged, 198.51.100.7, 10.0.0.2' };
      dropForwarded(headers, proxies);
      return headers;
    };
    expect(seenBy(1)).toEqual({ 'x-forwarded-for': '10.0.0.2' });
    expect(seenBy(2)).toEqual({ 'x-forwarded-for': '198.51.100.7' });
    expect(seenBy(5)).toEqual({});
  });
});
