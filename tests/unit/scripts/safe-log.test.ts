import { describe, expect, it } from 'vitest';
import { withoutMessage } from '../../../scripts/lib/http/safe-log.mjs';

const named = 'Ada Example';

describe('what is logged of an error', () => {
  it('is kind, code and places, not what it says, causes included', () => {
    const cause = Object.assign(new RangeError(`Key (name)=(${named}) exists\n    at the theatre`), {
      code: '23505',
    });
    const text = withoutMessage(new TypeError(`Failed query: select $1\nparams: ${named}`, { cause }));
    expect(text).not.toContain('Ada');
    expect(text).not.toContain('theatre');
    expect(text).toMatch(/^TypeError\n {4}at .*safe-log\.test\.ts/);
    expect(text).toContain('caused by RangeError 23505\n');
  });

  it('is the same when the error comes as text', () => {
    const { stack = '' } = new TypeError(`no such patient: ${named}`);
    const text = withoutMessage(`12:00 [ERROR] ${stack}`);
    expect(text).not.toContain('Ada');
    expect(text).toMatch(/^TypeError\n {4}at /);
    expect(withoutMessage(`DrizzleQueryError: Failed query: select $1\nparams: ${named}`)).toBe(
      'DrizzleQueryError',
    );
  });

  it('leaves plain words as they are and objects out', () => {
    expect(withoutMessage('Could not render /desk')).toBe('Could not render /desk');
    expect(withoutMessage({ name: named })).toBe('(not logged)');
  });
});
