import { useEffect, useState } from 'react';
import { blocking } from '../../domain/checks/flag.ts';
import { Key } from '../ui/Key.tsx';
import type { DeskState } from './desk-store.ts';
import { countInWords, countsByLevel, openFlags } from './flag-order.ts';
import { useDesk, useDeskTools } from './use-desk.ts';

const countsOf = (state: DeskState) =>
  countsByLevel(openFlags(state.flags, state.answers))
    .map(({ count }) => count)
    .join(' ');

/** What stands in the way of a signature, in words; empty when nothing does. */
export const blockedBy = (state: Pick<DeskState, 'flags' | 'answers' | 'bad'>): string => {
  const unread = Object.keys(state.bad).length;
  if (unread > 0) return unread === 1 ? '1 entry cannot be read' : `${unread} entries cannot be read`;
  const left = countsByLevel(blocking(state.flags, state.answers)).filter(({ count }) => count > 0);
  return left.map(({ level, count }) => countInWords(count, level)).join(', ');
};

const Counts = () => {
  const counts = useDesk(countsOf).split(' ').map(Number);
  const levels = ['contradiction', 'omission', 'caution'] as const;
  return levels.map((level, index) => (
    <span key={level} className={`count-${level}`}>
      {countInWords(counts[index] ?? 0, level)}
    </span>
  ));
};

/** Says changes of the counts once the keys have rested. */
const Announcer = () => {
  const counts = useDesk(countsOf);
  const [said, setSaid] = useState('');
  useEffect(() => {
    const timer = setTimeout(() => {
      const [contradictions = 0, omissions = 0, cautions = 0] = counts.split(' ').map(Number);
      setSaid(
        [
          countInWords(contradictions, 'contradiction'),
          countInWords(omissions, 'omission'),
          countInWords(cautions, 'caution'),
        ].join(', '),
      );
    }, 1200);
    return () => clearTimeout(timer);
  }, [counts]);
  return (
    <span className="sr-only" role="status">
      {said}
    </span>
  );
};

interface Props {
  press: (code: string) => void;
  onSign: () => void;
}

/** Counts, the keys that are used most, and the signature with what stands in its way. */
export const BottomBar = ({ press, onSign }: Props) => {
  const { readOnly } = useDeskTools();
  const blocked = useDesk(blockedBy);
  const printed = [
    { code: 'KeyN', key: 'N', does: 'next flag' },
    { code: 'KeyE', key: 'E', does: 'next empty' },
    { code: 'KeyS', key: 'S', does: 'save' },
    { code: 'Slash', key: '?', does: 'all keys' },
  ];
  return (
    <footer className="bottom-bar">
      <Counts />
      <Announcer />
      {!readOnly &&
        printed.map(({ code, key, does }) => (
          <button key={code} type="button" className="bottom-key" onClick={() => press(code)}>
            {does} <Key>{key}</Key>
          </button>
        ))}
      {!readOnly && (
        <button type="button" className="button bottom-sign" aria-disabled={blocked !== ''} onClick={onSign}>
          {blocked === '' ? 'Sign' : `Sign: ${blocked} first`} <kbd className="key">X</kbd>
        </button>
      )}
    </footer>
  );
};
