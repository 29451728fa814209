import { describe, expect, it } from 'vitest';
import { canonical, verificationCode } from '../../../src/domain/signing/canonical.ts';

describe('canonical', () => {
  it('writes the same value as the same text, whatever the order of its keys', () => {
    expect(canonical({ b: 1, a: [1.0, 'é', null] })).toBe('{"a":[1,"é",null],"b":1}');
    expect(canonical({ a: [1, 'é', null], b: 1 })).toBe(canonical({ b: 1, a: [1, 'é', null] }));
  });

  it('refuses what is not JSON', () => {
    expect(() => canonical(undefined)).toThrow(TypeError);
  });
});

describe('verificationCode', () => {
  it('has twelve signs that are not mistaken for one another', () => {
    const code = verificationCode('f'.repeat(64));
    expect(code).toMatch(/^(?:[2-9A-HJKMNP-Z]{3}-){3}[2-9A-HJKMNP-Z]{3}$/);
    expect(verificationCode(`${'f'.repeat(63)}e`)).not.toBe(code);
  });
});
