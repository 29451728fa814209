import type { ProseFinding } from '../prose/finding.ts';
import { readProse } from '../prose/read.ts';
import type { CaseRecord } from '../record/schema.ts';

interface FreeTextFinding extends Pick<ProseFinding, 'kind' | 'words' | 'recorded'> {
  /** The field in which the words stand. */
  field: string;
  /** The field that denies them. */
  recordedIn: string;
}

/** Words in the free text of a record that its own facts deny. The fellow eye's findings are about another eye and are left out. */
export const freeTextFindings = (record: CaseRecord): FreeTextFinding[] => {
  const { before, breaks, endOfCase, aftercare, who } = record;
  const texts = [
    { field: 'who.whyChanged', text: who?.whyChanged },
    { field: 'before.indication', text: before?.indication },
    { field: 'breaks.note', text: breaks?.note },
    { field: 'endOfCase.extraSteps', text: endOfCase?.extraSteps },
    { field: 'endOfCase.remarks', text: endOfCase?.remarks },
    { field: 'aftercare.note', text: aftercare?.note },
  ];
  return texts.flatMap(({ field, text }) =>
    text === undefined
      ? []
      : readProse(text, record).map(({ kind, words, recorded, field: recordedIn }) => ({
          kind,
          words,
          recorded,
          field,
          recordedIn,
        })),
  );
};
