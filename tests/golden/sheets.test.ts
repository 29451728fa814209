import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { draftNote } from '../../src/domain/drafting/draft.ts';
import type { Draft } from '../../src/domain/drafting/sheet.ts';
import { draftLetter, type LetterKind, letterKinds } from '../../src/domain/letters/letters.ts';
import { readRecord } from '../../src/domain/record/read.ts';

const fixtures = new URL('../fixtures/', import.meta.url);

const written = ({ title, sections, tables }: Draft): string =>
  [
    title,
    ...sections.map(
      ({ heading, statements }) => `\n${heading}\n${statements.map(({ text }) => text).join('\n')}`,
    ),
    ...tables.map(
      ({ heading, columns, rows }) =>
        `\n${heading}\n${[columns, ...rows].map((row) => row.join(' | ')).join('\n')}`,
    ),
    '',
  ].join('\n');

describe.each(readdirSync(fixtures).map((file) => file.replace('.json', '')))('%s', (name) => {
  const read = readRecord(JSON.parse(readFileSync(new URL(`${name}.json`, fixtures), 'utf8')));
  if (!read.ok) throw new Error(`${name} is not a record`);

  it('drafts the note as it was read and accepted', async () => {
    await expect(written(draftNote(read.value))).toMatchFileSnapshot(`${name}.note.txt`);
  });

  it.each(Object.keys(letterKinds) as LetterKind[])('drafts the letter: %s', async (kind) => {
    await expect(written(draftLetter(kind, read.value))).toMatchFileSnapshot(`${name}.${kind}.txt`);
  });
});
