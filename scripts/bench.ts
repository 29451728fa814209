import { readdirSync, readFileSync } from 'node:fs';
import { checkRecord } from '../src/domain/checks/engine.ts';
import { rules } from '../src/domain/checks/registry.ts';
import { draftNote } from '../src/domain/drafting/draft.ts';
import { mergeSheet } from '../src/domain/drafting/merge.ts';
import { numbersOf } from '../src/domain/physics/numbers.ts';
import { readProse } from '../src/domain/prose/read.ts';
import { readRecord } from '../src/domain/record/read.ts';
import type { CaseRecord } from '../src/domain/record/schema.ts';
import { draftDocx } from '../src/server/documents/note-docx.ts';
import { expressed, generalEngine } from './bench/general-engine.ts';
import { microseconds, microsecondsSync, show, table } from './bench/measure.ts';
import { weights } from './bench/weights.ts';

const folder = 'tests/fixtures';
const records: CaseRecord[] = readdirSync(folder).map((name) => {
  const read = readRecord(JSON.parse(readFileSync(`${folder}/${name}`, 'utf8')));
  if (!read.ok) throw new Error(`${name} is not a record`);
  return read.value;
});

let turn = 0;
const next = (): CaseRecord => {
  turn = (turn + 1) % records.length;
  const record = records[turn];
  if (record === undefined) throw new Error('There are no fixtures');
  return record;
};

const ids = new Set(expressed.map(({ id }) => id));
const same = rules.filter(({ id }) => ids.has(id));
const general = generalEngine();
const unit = { name: 'Unit', service: '', address: '', telephone: '', email: '', demonstration: false };
const at = '2000-01-01T00:00:00Z';

const check = microsecondsSync(() => checkRecord(next()));
const draft = microsecondsSync(() => mergeSheet(null, draftNote(next())));
const both = microsecondsSync(() => {
  const record = next();
  checkRecord(record);
  mergeSheet(null, draftNote(record));
});
const numbers = microsecondsSync(() => numbersOf(next()));
const ours = microsecondsSync(() => {
  const record = next();
  for (const rule of same) rule.check(record);
});
const theirs = await microseconds(() => general(next()));
const sheets = records.map((record) => mergeSheet(null, draftNote(record)));
const docx = await microseconds(() => {
  const record = next();
  return draftDocx(record, sheets[turn] ?? { title: '', sections: [] }, unit, 1, at);
}, 20);
const words =
  sheets[0]?.sections.flatMap(({ statements }) => statements.map(({ text }) => text)).join(' ') ?? '';
const long = Array.from({ length: Math.ceil(2000 / words.split(' ').length) }, () => words).join(' ');
const [first] = records;
const prose = first === undefined ? 0 : microsecondsSync(() => readProse(long, first));

table('At each key, over the five fixtures', [
  [`check, ${rules.length} rules with geometry`, show(check), 'goal: 0.5 ms'],
  ['draft and merge the note', show(draft), ''],
  ['check and draft', show(both), 'goal: under 1 ms'],
  ['every figure of a record', show(numbers), 'goal: 0.2 ms'],
  [`read ${long.split(' ').length} words against a record`, show(prose), 'goal: 5 ms at 4× slowdown'],
]);
table(`${expressed.length} conditions of ${same.length} rules, here and in json-rules-engine`, [
  ['ours', show(ours), ''],
  ['json-rules-engine', show(theirs), `${Math.round(theirs / ours)}×`],
]);
table('Documents', [
  ['note as DOCX', show(docx), `${Math.round(1_000_000 / docx)} a second; goal: under 15 ms`],
]);
weights();
