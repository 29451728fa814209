import { useMemo } from 'react';
import type { LetterView, SaveLetter } from '../../domain/letters/api.ts';
import { takenOut } from '../../domain/letters/words.ts';
import { readProse } from '../../domain/prose/read.ts';
import type { CaseRecord } from '../../domain/record/schema.ts';
import { LetterSheet } from './LetterSheet.tsx';
import { ReaderChoice, type ReaderOption } from './ReaderChoice.tsx';
import { SendingPanel } from './SendingPanel.tsx';
import { useLetter } from './use-letter.ts';

interface Props {
  id: string;
  letter: LetterView;
  record: CaseRecord;
  readers: ReaderOption[];
  /** Whom the letter greets, and what they are to the patient; `null` where the letter is the patient's own. */
  named: { name: string; as: string } | null;
  /** The patient's own letter goes on paper. */
  isPatients: boolean;
  maySend: boolean;
}

const deniedIn = ({ sheet }: SaveLetter, record: CaseRecord) =>
  new Map(
    sheet.sections
      .flatMap(({ statements }) => statements)
      .filter(({ origin }) => origin !== 'drafted' && origin !== 'deleted')
      .map(({ id, text }) => [id, readProse(text, record)] as const)
      .filter(([, found]) => found.length > 0),
  );

/** One letter: its words, its reader, and its way. */
export const LetterPage = ({ id, letter, record, readers, named, isPatients, maySend }: Props) => {
  const desk = useLetter(id, letter);
  const { view, content, isOpen, theirs } = desk;
  const shown = isOpen ? content : view;
  const denied = useMemo(() => deniedIn(content, record), [content, record]);
  const reader = readers.find((one) => one.id === shown.recipientId);
  const out = takenOut(shown.sheet);
  const cautions = [
    ...(named !== null && reader !== undefined && !reader.isNamed
      ? [
          `The letter greets ${named.name}, the ${named.as} in the signed note, and would go to ${reader.name}.`,
        ]
      : []),
    ...(out.length > 0 ? [`Left out of what was drafted: ${out.join(' ')}`] : []),
  ];

  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-6 lg:grid-cols-[minmax(0,1fr)_20rem]">
      <LetterSheet
        sheet={shown.sheet}
        isOpen={isOpen}
        denied={denied}
        theirs={theirs?.sheet}
        onChange={(sheet) => desk.setContent({ ...content, sheet })}
      />
      <aside className="flex flex-col gap-4" aria-label="Sending">
        {!isPatients && (
          <ReaderChoice
            readers={readers}
            chosen={shown.recipientId}
            namedAs={named?.as ?? ''}
            isOpen={isOpen}
            onChoose={(recipientId) => desk.setContent({ ...content, recipientId })}
          />
        )}
        <SendingPanel
          id={id}
          desk={desk}
          reader={reader}
          isPatients={isPatients}
          isDenied={denied.size > 0}
          cautions={isOpen ? cautions : []}
          maySend={maySend}
        />
      </aside>
    </div>
  );
};
