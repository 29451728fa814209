import type { LetterView } from '../../domain/letters/api.ts';
import type { ReaderOption } from './ReaderChoice.tsx';
import type { useLetter } from './use-letter.ts';

interface Props {
  id: string;
  desk: ReturnType<typeof useLetter>;
  reader: ReaderOption | undefined;
  isPatients: boolean;
  isDenied: boolean;
  /** What is possible and worth a second look before it goes. */
  cautions: readonly string[];
  maySend: boolean;
}

const tones = { waiting: '', queued: '', sent: 'notice-good', failed: 'notice-bad' } as const;

const stateWords = ({ state, sentAt, sentTo }: LetterView): string => {
  if (state === 'sent')
    return sentTo === null ? `Handed over on paper, ${sentAt}.` : `Sent to ${sentTo}, ${sentAt}.`;
  return {
    waiting: 'To be prepared and sent.',
    queued: 'On its way. This page shows when it has gone.',
    failed: 'Not sent.',
  }[state];
};

const obstacle = ({ reader, isPatients, isDenied }: Props): string => {
  if (isDenied) return 'Some words say otherwise than the signed note. Change them before sending.';
  if (isPatients) return '';
  if (reader === undefined) return 'Choose whom the letter goes to before sending.';
  return reader.isConfirmed ? '' : 'Confirm the address in the directory before sending.';
};

/** How far the letter is, what stands in its way, and the ways on. */
export const SendingPanel = (props: Props) => {
  const { id, desk, isPatients, isDenied, cautions, maySend } = props;
  const { view, isOpen, isKept, failure, theirs, sending } = desk;
  const inTheWay = obstacle(props);
  const isHeld = sending || theirs !== null;
  return (
    <>
      <p className={`notice ${tones[view.state]}`} role="status">
        <strong>{stateWords(view)}</strong>
        {view.lastError !== null && ` ${view.lastError}`}
      </p>
      {theirs !== null && (
        <div className="notice notice-bad" role="alert">
          <p>
            Somebody else kept this letter meanwhile. Your words are all here; theirs stand below the
            sentences that differ.
          </p>
          <p className="mt-2 flex flex-wrap gap-2">
            <button type="button" className="button button-quiet" onClick={() => desk.settle('mine')}>
              Keep what stands here
            </button>
            <button type="button" className="button button-quiet" onClick={() => desk.settle('theirs')}>
              Take theirs
            </button>
          </p>
        </div>
      )}
      {theirs === null && failure !== null && (
        <p className="notice notice-bad" role="alert">
          {failure.message}
        </p>
      )}
      {cautions.map((words) => (
        <p key={words} className="notice letter-caution">
          <strong>Caution.</strong> {words}
        </p>
      ))}
      <p aria-live="polite" className="text-soft">
        {isOpen ? (isKept ? 'saved' : 'not saved yet') : ''}
      </p>
      <p>
        <a href={`/api/letters/${id}/letter.docx`}>
          {isOpen ? 'Look at the document' : 'The document that was sent'}
        </a>
      </p>
      {isOpen && maySend && (
        <>
          {inTheWay !== '' && (
            <p id="in-the-way" className="font-semibold">
              {inTheWay}
            </p>
          )}
          {!isPatients && (
            <button
              type="button"
              className="button"
              disabled={inTheWay !== '' || isHeld}
              aria-describedby={inTheWay === '' ? undefined : 'in-the-way'}
              onClick={() => void desk.send('mail')}
            >
              {view.state === 'failed' ? 'Try again' : 'Send'}
            </button>
          )}
          <button
            type="button"
            className={isPatients ? 'button' : 'button button-quiet'}
            disabled={isDenied || isHeld}
            onClick={() => void desk.send('paper')}
          >
            Printed, and handed over or posted
          </button>
        </>
      )}
    </>
  );
};
