import { useMutation } from '@tanstack/react-query';
import { type FormEvent, useId, useState } from 'react';
import { type CaseSigned, meanings, type SignCase } from '../../domain/api.ts';
import { isAnswered } from '../../domain/checks/flag.ts';
import { Dialog } from '../ui/Dialog.tsx';
import { postSignature, Refusal } from './case-api.ts';
import type { Autosave } from './use-autosave.ts';
import { useDesk } from './use-desk.ts';

interface Props {
  id: string;
  autosave: Autosave;
  onClose: () => void;
  onSigned: (signed: CaseSigned) => void;
}

type Meaning = SignCase['meaning'];
const meaningKeys = Object.keys(meanings) as Meaning[];

/** Signing: what it means, and the password once more. */
export const SignDialog = ({ id, autosave, onClose, onSigned }: Props) => {
  const flags = useDesk((state) => state.flags);
  const answers = useDesk((state) => state.answers);
  const [meaning, setMeaning] = useState<Meaning>('author');
  const [password, setPassword] = useState('');
  const [problem, setProblem] = useState<{ code: string; message: string } | null>(null);
  const errorId = useId();

  const answered = flags.filter((flag) => flag.level === 'omission' && isAnswered(flag, answers));
  const cautions = flags.filter((flag) => flag.level === 'caution' && !isAnswered(flag, answers)).length;

  const { mutate, isPending } = useMutation({
    networkMode: 'always',
    mutationFn: async () => {
      if (!(await autosave.save())) {
        throw new Refusal({
          code: 'unsaved',
          message: 'The case could not be saved first. Close this and see why.',
        });
      }
      return postSignature(id, autosave.revisionNow(), { password, meaning });
    },
    onSuccess: onSigned,
    onError: (error) => {
      const code = error instanceof Refusal ? error.answer.code : 'failed';
      setProblem({ code, message: error.message });
      if (code === 'wrong-password') setPassword('');
    },
  });

  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (password === '') setProblem({ code: 'wrong-password', message: 'Write your password.' });
    else mutate();
  };
  const isPassword = problem?.code === 'wrong-password' || problem?.code === 'too-many-attempts';

  return (
    <Dialog title="Sign the operative note" onClose={onClose}>
      <form onSubmit={submit} className="flex flex-col gap-4">
        <fieldset className="flex flex-col gap-1">
          <legend className="label mb-1">What your signature means</legend>
          {meaningKeys.map((key) => (
            <label key={key} className="flex items-baseline gap-2">
              <input
                type="radio"
                name="meaning"
                value={key}
                checked={meaning === key}
                onChange={() => setMeaning(key)}
              />
              {meanings[key]}
            </label>
          ))}
        </fieldset>
        <p>
          {answered.length === 0
            ? 'No omission is answered with a reason.'
            : `${answered.length === 1 ? '1 omission is' : `${answered.length} omissions are`} answered with a reason, printed in the note.`}{' '}
          {cautions > 0 &&
            `${cautions === 1 ? '1 caution stands' : `${cautions} cautions stand`} in the margin.`}
        </p>
        <label className="label">
          Your password
          <input
            className="input"
            type="password"
            data-first
            autoComplete="current-password"
            value={password}
            aria-invalid={isPassword}
            aria-describedby={isPassword ? errorId : undefined}
            onChange={(event) => setPassword(event.target.value)}
          />
        </label>
        {problem !== null && (
          <p id={errorId} className="error" role="alert">
            {problem.message}
          </p>
        )}
        <button type="submit" className="button" disabled={isPending}>
          {isPending ? 'Signing' : 'Sign'}
        </button>
        <p className="text-soft">
          After this nobody can change the note. What turns up later is added as an addendum.
        </p>
      </form>
    </Dialog>
  );
};
