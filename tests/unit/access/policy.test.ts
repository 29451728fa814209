import { describe, expect, it } from 'vitest';
import { desksFor, homeOf } from '../../../src/domain/access/desks.ts';
import { actions, caseStates, may, roles } from '../../../src/domain/access/policy.ts';

/** Role × action × state, as it was agreed. A new role or action fails here until it is agreed too. */
const agreed: Readonly<Record<string, string>> = {
  'list:read': 'surgeon secretary administrator',
  'list:change': 'surgeon secretary administrator',
  'case:list-own': 'surgeon',
  'case:read-draft': 'surgeon | draft',
  'case:write': 'surgeon | draft',
  'case:sign': 'surgeon | draft',
  'signed:read': 'surgeon secretary coder auditor | signed',
  'signed:verify': 'surgeon auditor | signed',
  'note:add-to': 'surgeon | signed',
  'letters:list': 'surgeon secretary',
  'letter:read': 'surgeon secretary | signed',
  'letter:write': 'surgeon secretary | signed',
  'letter:send': 'secretary | signed',
  'recipients:read': 'secretary administrator',
  'recipients:change': 'secretary administrator',
  'codes:list': 'coder',
  'codes:read': 'coder | signed',
  'codes:mark': 'coder | signed',
  'codes:export': 'coder',
  'audit:list': 'auditor',
  'audit:log': 'auditor administrator',
  'people:change': 'administrator',
  'unit:change': 'administrator',
  'handbook:read': 'surgeon secretary coder auditor administrator',
};

describe('the policy table', () => {
  it('knows exactly the actions that were agreed', () => {
    expect([...actions].sort()).toEqual(Object.keys(agreed).sort());
  });

  it.each(actions)('%s', (action) => {
    const [who = '', state] = (agreed[action] ?? '').split(' | ');
    for (const role of roles) {
      const allowed = who.split(' ').includes(role);
      expect([role, may([role], action)]).toEqual([role, allowed]);
      for (const one of caseStates) {
        expect([role, one, may([role], action, one)]).toEqual([
          role,
          one,
          allowed && (state === undefined || state === one),
        ]);
      }
    }
  });

  it('gives nobody without a role anything', () => {
    for (const action of actions) expect(may([], action)).toBe(false);
  });

  it('gives every role a desk to land on', () => {
    for (const role of roles) expect(desksFor([role]).map(({ href }) => href)).toContain(homeOf([role]));
  });
});
