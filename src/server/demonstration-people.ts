import type { Role } from '../domain/access/policy.ts';

interface DemonstrationPerson {
  name: string;
  title: string;
  email: string;
  role: Role;
  password: string;
}

/** The invented people of the demonstration unit, with the passwords that are printed for everybody to read. */
export const demonstrationPeople: readonly DemonstrationPerson[] = [
  {
    name: 'A. Surgeon',
    title: 'Consultant vitreoretinal surgeon',
    email: 'surgeon@example.org',
    role: 'surgeon',
    password: 'demonstration-surgeon',
  },
  {
    name: 'B. Surgeon',
    title: 'Vitreoretinal fellow',
    email: 'fellow@example.org',
    role: 'surgeon',
    password: 'demonstration-fellow',
  },
  {
    name: 'C. Secretary',
    title: 'Medical secretary',
    email: 'secretary@example.org',
    role: 'secretary',
    password: 'demonstration-secretary',
  },
  {
    name: 'D. Coder',
    title: 'Clinical coder',
    email: 'coder@example.org',
    role: 'coder',
    password: 'demonstration-coder',
  },
  {
    name: 'E. Auditor',
    title: 'Clinical auditor',
    email: 'auditor@example.org',
    role: 'auditor',
    password: 'demonstration-auditor',
  },
  {
    name: 'F. Administrator',
    title: 'Administrator',
    email: 'administrator@example.org',
    role: 'administrator',
    password: 'demonstration-administrator',
  },
];
