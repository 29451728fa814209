import type { Sheet, Statement } from '../../domain/drafting/sheet.ts';
import type { ProseFinding } from '../../domain/prose/finding.ts';
import { StatementBox } from './StatementBox.tsx';

interface Props {
  sheet: Sheet;
  isOpen: boolean;
  denied: ReadonlyMap<string, readonly ProseFinding[]>;
  /** Another version of the letter that was kept meanwhile. */
  theirs: Sheet | undefined;
  onChange: (sheet: Sheet) => void;
}

const replaced = (sheet: Sheet, next: Statement): Sheet => ({
  ...sheet,
  sections: sheet.sections.map((section) => ({
    ...section,
    statements: section.statements.map((one) => (one.id === next.id ? next : one)),
  })),
});

/** The letter as words: statements to write in while it waits, plain sentences once it has gone. */
export const LetterSheet = ({ sheet, isOpen, denied, theirs, onChange }: Props) => {
  const other = new Map(
    theirs?.sections.flatMap(({ statements }) => statements.map(({ id, text }) => [id, text] as const)),
  );
  return (
    <article
      className="border border-rule bg-sheet p-4 font-serif leading-relaxed sm:p-8"
      aria-label="Letter"
    >
      {sheet.sections.map(({ id, heading, statements }) => (
        <section key={id} className="mb-4">
          {id !== 'salutation' && <h2 className="text-base">{heading}</h2>}
          {statements.map((statement, at) =>
            isOpen ? (
              <StatementBox
                key={statement.id}
                statement={statement}
                label={`${heading}, sentence ${at + 1}`}
                denied={denied.get(statement.id) ?? []}
                theirs={other.get(statement.id) === statement.text ? undefined : other.get(statement.id)}
                onChange={(next) => onChange(replaced(sheet, next))}
              />
            ) : (
              statement.origin !== 'deleted' && (
                <p key={statement.id} className="my-1">
                  {statement.text}
                </p>
              )
            ),
          )}
        </section>
      ))}
    </article>
  );
};
