import type { Visit } from '../accounts/visit.ts';
import type { FormErrors } from './read-form.ts';
import { addRecipient, changeRecipient, confirmRecipient, setWrittenTo } from './recipients.ts';

export type DirectoryAnswer =
  | { kind: 'done'; said: 'added' | 'changed' | 'confirmed' | 'ended' | 'resumed' }
  /** `id` is that of the entry that was to be changed; absent for a new one. */
  | { kind: 'refused'; id?: string; form: FormErrors }
  | { kind: 'stale'; message: string };

/** What the directory's forms ask for. */
export const answerDirectoryForm = async (visit: Visit, sent: FormData): Promise<DirectoryAnswer> => {
  const asked = sent.get('form');
  const id = String(sent.get('id') ?? '');
  const revision = Number(sent.get('revision'));
  if (asked === 'confirm' || asked === 'end' || asked === 'resume') {
    const result =
      asked === 'confirm'
        ? await confirmRecipient(visit, id, revision)
        : await setWrittenTo(visit, id, revision, asked === 'resume');
    if (!result.ok) return { kind: 'stale', message: result.error.message };
    return {
      kind: 'done',
      said: ({ confirm: 'confirmed', end: 'ended', resume: 'resumed' } as const)[asked],
    };
  }
  const isNew = !sent.has('id');
  const result = isNew ? await addRecipient(visit, sent) : await changeRecipient(visit, id, revision, sent);
  if (result.ok) return { kind: 'done', said: isNew ? 'added' : 'changed' };
  return { kind: 'refused', ...(isNew ? {} : { id }), form: result.error };
};
