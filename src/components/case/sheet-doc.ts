import type { Sheet, Statement } from '../../domain/drafting/sheet.ts';

/** The sheet as the editor holds it: sections of statements, each its own node. */
export interface StatementNode {
  type: 'statement';
  attrs: { id: string | null; origin: Statement['origin']; drafted: string; reads: string[] };
  content?: { type: 'text'; text: string }[];
}

export interface SectionNode {
  type: 'section';
  attrs: { id: string; heading: string };
  content?: StatementNode[];
}

export interface SheetDoc {
  type: 'doc';
  content: SectionNode[];
}

type Section = Sheet['sections'][number];

export const statementNode = ({ id, origin, drafted, reads, text }: Statement): StatementNode => ({
  type: 'statement',
  attrs: { id, origin, drafted, reads },
  ...(text === '' ? {} : { content: [{ type: 'text', text }] }),
});

/** Statements that stand in the sheet: all but those taken out. */
export const standing = (section: Section): Statement[] =>
  section.statements.filter((statement) => statement.origin !== 'deleted');

export const docFromSheet = (sheet: Sheet): SheetDoc => ({
  type: 'doc',
  content: sheet.sections.map((section) => ({
    type: 'section',
    attrs: { id: section.id, heading: section.heading },
    content: standing(section).map(statementNode),
  })),
});

const textOf = (node: StatementNode) => (node.content ?? []).map((part) => part.text).join('');

const originOf = (text: string, known: Statement): Statement['origin'] => {
  if (text === '') return 'deleted';
  if (text === known.drafted) return 'drafted';
  if (text === known.text && known.origin !== 'deleted') return known.origin;
  return known.origin === 'parted' ? 'parted' : 'edited';
};

/** Puts the statements that are no longer in the editor back behind those that they followed, as taken out. */
const withTakenOut = (before: readonly Statement[], now: readonly Statement[]): Statement[] => {
  const result = [...now];
  let place = 0;
  for (const statement of before) {
    const at = result.findIndex(({ id }) => id === statement.id);
    if (at !== -1) place = at + 1;
    else if (statement.origin !== 'own') {
      result.splice(place, 0, { ...statement, origin: 'deleted', text: '' });
      place += 1;
    }
  }
  return result;
};

const ownIds = (sheet: Sheet) =>
  sheet.sections
    .flatMap(({ statements }) => statements)
    .map(({ id }) => Number(/^own-(\d+)$/.exec(id)?.[1] ?? 0));

/**
 * What people made of a sheet: the statements as they stand in the editor, each known by its id. Drafted statements
 * whose words changed become edited (drafted again when the words are put back), missing ones are taken out, and what
 * has no known id in its section is somebody's own. Own statements without words are dropped.
 */
export const sheetFromDoc = (doc: SheetDoc, before: Sheet): Sheet => {
  let lastOwn = Math.max(0, ...ownIds(before));
  const bySection = new Map(doc.content.map((section) => [section.attrs.id, section]));

  const sectionNow = (section: Section): Section => {
    const known = new Map(section.statements.map((statement) => [statement.id, statement]));
    const statements: Statement[] = [];
    for (const node of bySection.get(section.id)?.content ?? []) {
      const text = textOf(node);
      const statement = node.attrs.id === null ? undefined : known.get(node.attrs.id);
      if (statement === undefined) {
        if (text.trim() === '') continue;
        const given = node.attrs.origin === 'own' ? node.attrs.id : null;
        lastOwn += 1;
        statements.push({ id: given ?? `own-${lastOwn}`, origin: 'own', text, drafted: '', reads: [] });
        continue;
      }
      known.delete(statement.id);
      if (statement.origin === 'own') {
        if (text !== '') statements.push({ ...statement, text });
      } else statements.push({ ...statement, text, origin: originOf(text, statement) });
    }
    return { ...section, statements: withTakenOut(section.statements, statements) };
  };

  return { ...before, sections: before.sections.map(sectionNow) };
};

const changeStatement = (sheet: Sheet, id: string, change: (statement: Statement) => Statement): Sheet => ({
  ...sheet,
  sections: sheet.sections.map((section) => ({
    ...section,
    statements: section.statements.map((statement) => (statement.id === id ? change(statement) : statement)),
  })),
});

/** The words of the draft in place of one's own: answers a parted statement, or puts one back that was taken out. */
export const takeDrafted = (sheet: Sheet, id: string): Sheet =>
  changeStatement(sheet, id, (statement) => ({ ...statement, text: statement.drafted, origin: 'drafted' }));

/** Keeps one's own words although the facts changed: the statement is edited, no longer parted. */
export const keepEdited = (sheet: Sheet, id: string): Sheet =>
  changeStatement(sheet, id, (statement) => ({ ...statement, origin: 'edited' }));
