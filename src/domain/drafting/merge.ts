import type { Draft, DraftedStatement, Sheet, Statement } from './sheet.ts';

type Section = Sheet['sections'][number];

const fresh = ({ id, text, reads }: DraftedStatement): Statement => ({
  id,
  origin: 'drafted',
  text,
  drafted: text,
  reads,
});

/** What becomes of a kept statement when the templates now say `next`, or nothing at all. */
const follow = (kept: Statement, next: DraftedStatement | undefined): Statement | undefined => {
  if (kept.origin === 'own') return kept;
  if (next === undefined) {
    // Words that somebody typed stay even when their facts have gone.
    if (kept.origin !== 'edited' && kept.origin !== 'parted') return undefined;
    return { ...kept, origin: 'parted', drafted: '' };
  }
  const { text: drafted, reads } = next;
  if (kept.origin === 'drafted') return fresh(next);
  if (kept.origin === 'deleted') return { ...kept, drafted, reads };
  if (kept.text === drafted) return fresh(next);
  // The edit was made upon what was drafted then: if that is what is drafted now, they have not parted.
  const origin = kept.origin === 'parted' || kept.drafted !== drafted ? 'parted' : 'edited';
  return { ...kept, origin, drafted, reads };
};

const mergeSection = (kept: Section | undefined, drafted: Draft['sections'][number] | undefined): Section => {
  const before = kept?.statements ?? [];
  const now = drafted?.statements ?? [];
  const byId = new Map(now.map((statement) => [statement.id, statement]));
  const followed = before.flatMap((statement) => follow(statement, byId.get(statement.id)) ?? []);
  const present = new Set(before.map(({ id }) => id));
  const statements = [...followed];
  // A new statement comes in behind the one that the template has before it.
  now.forEach((statement, at) => {
    if (present.has(statement.id)) return;
    const earlier = new Set(now.slice(0, at).map(({ id }) => id));
    const behind = statements.findLastIndex(({ id }) => earlier.has(id));
    statements.splice(behind + 1, 0, fresh(statement));
  });
  return {
    id: drafted?.id ?? kept?.id ?? '',
    heading: drafted?.heading ?? kept?.heading ?? '',
    statements,
  };
};

/**
 * Brings a sheet up to date with a draft: drafted statements are redrawn in place, edited ones are kept and part when their facts have changed,
 * deleted ones stay deleted, own ones stay where they are, new ones come where the template has them. Merging twice changes nothing more.
 */
export const mergeSheet = (sheet: Sheet | null, draft: Draft): Sheet => {
  const kept = new Map((sheet?.sections ?? []).map((section) => [section.id, section]));
  const drafted = new Map(draft.sections.map((section) => [section.id, section]));
  const order = [...drafted.keys()];
  // A section that the template no longer makes keeps its place behind the one before it.
  (sheet?.sections ?? []).forEach(({ id }, at, all) => {
    if (drafted.has(id)) return;
    const before = all.slice(0, at).findLast((section) => order.includes(section.id));
    order.splice(before === undefined ? 0 : order.indexOf(before.id) + 1, 0, id);
  });
  const sections = order
    .map((id) => mergeSection(kept.get(id), drafted.get(id)))
    .filter(({ statements }) => statements.length > 0);
  return { title: draft.title, sections };
};
