import type { Visit } from '../accounts/visit.ts';
import { addPerson, setActive, setPassword } from './people.ts';
import type { FormErrors } from './read-form.ts';

export type PeopleAnswer =
  | { kind: 'done'; said: 'added' | 'let-in' | 'kept-out' | 'password-set' }
  | { kind: 'refused-new'; form: FormErrors }
  /** What was asked about this person cannot be done. */
  | { kind: 'refused'; id: string; asked: 'active' | 'password'; message: string };

/** What the forms about people ask for. */
export const answerPeopleForm = async (visit: Visit, sent: FormData): Promise<PeopleAnswer> => {
  const asked = sent.get('form');
  const id = String(sent.get('id') ?? '');
  if (asked === 'active' || asked === 'password') {
    const active = sent.get('active') === 'yes';
    const result =
      asked === 'active'
        ? await setActive(visit, id, active)
        : await setPassword(visit, id, String(sent.get('password') ?? ''));
    if (!result.ok) return { kind: 'refused', id, asked, message: result.error.message };
    return { kind: 'done', said: asked === 'password' ? 'password-set' : active ? 'let-in' : 'kept-out' };
  }
  const result = await addPerson(visit, sent);
  return result.ok ? { kind: 'done', said: 'added' } : { kind: 'refused-new', form: result.error };
};
