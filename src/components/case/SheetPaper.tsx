import type { Sheet } from '../../domain/drafting/sheet.ts';
import { standing } from './sheet-doc.ts';
import type { StatementMarks } from './statement-marks.ts';

/** The words of a sheet, not to be written in. Stands where the editor will stand, and looks the same. */
export const SheetPaper = ({ sheet, marks }: { sheet: Sheet; marks: StatementMarks }) => (
  <div className="sheet-words">
    {sheet.sections.map((section) => {
      const statements = standing(section);
      if (statements.length === 0) return null;
      return (
        <section key={section.id} className="sheet-section">
          <h3>{section.heading}</h3>
          <p>
            {statements.map(({ id, origin, text }) => (
              <span
                key={id}
                className={`statement ${marks.get(id) ?? ''}`}
                data-statement={id}
                data-origin={origin}
              >
                <span className="words">{text}</span>
                <span className="gap"> </span>
              </span>
            ))}
          </p>
        </section>
      );
    })}
  </div>
);
