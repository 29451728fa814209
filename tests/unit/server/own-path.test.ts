import { describe, expect, it } from 'vitest';
import { ownPath } from '../../../src/server/http/own-path.ts';

describe('ownPath', () => {
  it.each(['/', '/letters', '/cases/0000?from=1', '/a//b'])('goes back to %s', (path) => {
    expect(ownPath(path)).toBe(path);
  });

  it.each([
    null,
    '',
    'letters',
    'https://elsewhere.example.org',
    '//elsewhere.example.org',
    '/\\elsewhere.example.org',
    '/\t/elsewhere.example.org',
    '/\n\\elsewhere.example.org',
    '/.//elsewhere.example.org',
    '/a/..//elsewhere.example.org',
    '\t//elsewhere.example.org',
    'javascript:alert(1)',
  ])('does not follow %j', (path) => {
    expect(ownPath(path)).toBeUndefined();
  });

  it('leaves the part behind the hash out, and writes what a header can hold', () => {
    expect(ownPath('/letters#top')).toBe('/letters');
    expect(ownPath('/letters/é\r\nx')).toBe('/letters/%C3%A9x');
  });
});
