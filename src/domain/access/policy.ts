/** Who may do what, in which state of a case. The one table; routes, pages and buttons ask it. */
export const roles = ['surgeon', 'secretary', 'coder', 'auditor', 'administrator'] as const;
export type Role = (typeof roles)[number];

export const caseStates = ['draft', 'signed'] as const;
export type CaseState = (typeof caseStates)[number];

const anyState = caseStates;
const signedOnly = ['signed'] as const;
const draftOnly = ['draft'] as const;

interface Permission {
  roles: readonly Role[];
  /** States of the case in which it is allowed; absent when no case is concerned. */
  states?: readonly CaseState[];
}

const table = {
  'list:read': { roles: ['surgeon', 'secretary', 'administrator'] },
  'list:change': { roles: ['surgeon', 'secretary', 'administrator'] },
  'case:read-draft': { roles: ['surgeon'], states: draftOnly },
  'case:write': { roles: ['surgeon'], states: draftOnly },
  'case:sign': { roles: ['surgeon'], states: draftOnly },
  'signed:read': { roles: ['surgeon', 'secretary', 'coder', 'auditor'], states: signedOnly },
  'signed:verify': { roles: ['surgeon', 'auditor'], states: signedOnly },
  'note:add-to': { roles: ['surgeon'], states: signedOnly },
  'letters:list': { roles: ['secretary', 'surgeon'] },
  'letter:read': { roles: ['secretary', 'surgeon'], states: signedOnly },
  'letter:write': { roles: ['secretary', 'surgeon'], states: signedOnly },
  'letter:send': { roles: ['secretary'], states: signedOnly },
  'recipients:read': { roles: ['secretary', 'administrator'] },
  'recipients:change': { roles: ['secretary', 'administrator'] },
  'codes:list': { roles: ['coder'] },
  'codes:read': { roles: ['coder'], states: signedOnly },
  'codes:mark': { roles: ['coder'], states: signedOnly },
  'codes:export': { roles: ['coder'] },
  'audit:list': { roles: ['auditor'] },
  'audit:log': { roles: ['auditor', 'administrator'] },
  'people:change': { roles: ['administrator'] },
  'unit:change': { roles: ['administrator'] },
  'handbook:read': { roles },
  'case:list-own': { roles: ['surgeon'], states: anyState },
} as const satisfies Record<string, Permission>;

export type Action = keyof typeof table;
export const actions = Object.keys(table) as Action[];

/** Whether a person with these roles may do it; `state` is that of the case concerned, when one is. */
export const may = (held: readonly Role[], action: Action, state?: CaseState): boolean => {
  const permission: Permission = table[action];
  if (!permission.roles.some((role) => held.includes(role))) return false;
  return state === undefined || permission.states === undefined || permission.states.includes(state);
};
