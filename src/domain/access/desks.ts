import { type Action, may, type Role } from './policy.ts';

interface Desk {
  title: string;
  href: string;
  action: Action;
}

const desks: readonly Desk[] = [
  { title: 'Theatre list', href: '/', action: 'list:read' },
  { title: 'Letters', href: '/letters', action: 'letters:list' },
  { title: 'Coding', href: '/coding', action: 'codes:list' },
  { title: 'Auditing', href: '/auditing', action: 'audit:list' },
  { title: 'Directory', href: '/recipients', action: 'recipients:read' },
  { title: 'People', href: '/people', action: 'people:change' },
  { title: 'Unit', href: '/unit', action: 'unit:change' },
  { title: 'Handbook', href: '/handbook', action: 'handbook:read' },
];

/** The desks that a person may go to, in the order of the header. */
export const desksFor = (held: readonly Role[]): Desk[] => desks.filter((desk) => may(held, desk.action));

/** Where a person lands after signing in. */
export const homeOf = (held: readonly Role[]): string => desksFor(held)[0]?.href ?? '/handbook';
