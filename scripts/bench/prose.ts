import { pathToFileURL } from 'node:url';
import { draftNote } from '../../src/domain/drafting/draft.ts';
import { mergeSheet } from '../../src/domain/drafting/merge.ts';
import { readProse } from '../../src/domain/prose/read.ts';
import { cleanRecord } from '../../tests/support/clinical/generate.ts';
import { corpus } from '../../tests/support/prose-corpus/all.ts';
import { blind } from '../../tests/support/prose-corpus/blind.ts';
import { fresh } from '../../tests/support/prose-corpus/fresh.ts';
import { freshSecond } from '../../tests/support/prose-corpus/fresh-second.ts';
import { corpusRecord } from '../../tests/support/prose-corpus/records.ts';
import type { Sample } from '../../tests/support/prose-corpus/sample.ts';
import { type ClassScore, type Score, scoreReader } from '../../tests/support/prose-corpus/score.ts';

const percent = (part: number, whole: number) =>
  whole === 0 ? '–' : `${((part / whole) * 100).toFixed(1)}%`;

const row = (name: string, score: Omit<ClassScore, 'kind'>) =>
  `| ${[
    name,
    score.expected,
    percent(score.found, score.expected),
    percent(score.marked, score.expected),
    score.findings,
    percent(score.findings - score.falseAlarms, score.findings),
  ].join(' | ')} |`;

/** A Markdown table: per class the words expected, how many were found, and how many findings were right. */
export const scoreTable = (title: string, score: Score): string =>
  [
    `${title}: ${score.samples} sentences`,
    '',
    '| class | expected | recall | marked under any class | findings | precision |',
    '| --- | ---: | ---: | ---: | ---: | ---: |',
    ...score.classes.map((each) => row(each.kind, each)),
    row('**all**', score.total),
  ].join('\n');

const printed = (sample: Sample) => `${sample.record}: ${sample.text}`;

/** Every miss and every false alarm, a line each. */
export const scoreDetails = (score: Score): string =>
  [
    `Misses: ${score.misses.length}`,
    ...score.misses.map(
      ({ sample, expected, markedAs }) =>
        `- ${expected.kind} “${expected.words}”${markedAs === undefined ? '' : ` (marked as ${markedAs})`} in ${printed(sample)}`,
    ),
    '',
    `False alarms: ${score.alarms.length}`,
    ...score.alarms.map(
      ({ sample, finding }) =>
        `- ${finding.kind} “${finding.words}” (${finding.field}: ${finding.recorded}) in ${sample.nature} ${printed(sample)}`,
    ),
  ].join('\n');

const WORDS = 2000;
const RUNS = 25;

const median = (times: number[]) => times.sort((a, b) => a - b)[times.length >> 1] ?? 0;

const timed = (run: () => void): number => {
  const from = performance.now();
  run();
  return performance.now() - from;
};

export interface ReadingTimes {
  /** A text that was never read against this record, in ms. */
  first: number;
  /** The same text with one more letter in its middle, in ms. */
  keystroke: number;
}

/** Medians over several runs on a text of 2,000 words, the first runs left out. */
export const readingTimes = (): ReadingTimes => {
  const words = corpus
    .filter((sample) => sample.record === 'gasRight')
    .flatMap((sample) => (/[.!?]$/u.test(sample.text) ? sample.text : `${sample.text}.`).split(' '));
  const text = Array.from({ length: WORDS }, (_, at) => words[at % words.length]).join(' ');
  const middle = text.indexOf(' ', text.length >> 1);
  const runs = Array.from({ length: RUNS }, (_, run) => {
    const record = { ...corpusRecord('gasRight') };
    const first = timed(() => readProse(text, record));
    const letter = String.fromCharCode(97 + (run % 26));
    const typed = `${text.slice(0, middle)}${letter}${text.slice(middle)}`;
    return { first, keystroke: timed(() => readProse(typed, record)) };
  }).slice(5);
  return {
    first: median(runs.map(({ first }) => first)),
    keystroke: median(runs.map(({ keystroke }) => keystroke)),
  };
};

export interface GeneratedAlarms {
  sentences: number;
  alarms: number;
}

/** What the reader says of the notes drafted from sound records, until so many sentences have been read. */
export const generatedAlarms = (sentences: number): GeneratedAlarms => {
  const read: GeneratedAlarms = { sentences: 0, alarms: 0 };
  for (let number = 1; read.sentences < sentences; number += 1) {
    const record = cleanRecord(number);
    for (const { statements } of mergeSheet(null, draftNote(record)).sections)
      for (const { text } of statements) {
        read.sentences += text.split(/[.!?](?:\s|$)/u).filter((part) => part !== '').length;
        read.alarms += readProse(text, record).length;
      }
  }
  return read;
};

export interface ProseBench {
  generated: GeneratedAlarms;
  all: Score;
  heldOut: Score;
  open: Score;
  later: Score;
  blind: Score;
  times: ReadingTimes;
}

export const benchProse = (): ProseBench => ({
  all: scoreReader(readProse, corpus),
  heldOut: scoreReader(
    readProse,
    corpus.filter((sample) => sample.heldOut),
  ),
  open: scoreReader(
    readProse,
    corpus.filter((sample) => !sample.heldOut),
  ),
  later: scoreReader(readProse, [...fresh, ...freshSecond]),
  blind: scoreReader(readProse, blind),
  times: readingTimes(),
  generated: generatedAlarms(20_000),
});

/** The bench as Markdown. With details, the misses and alarms of the open two thirds; the rest stays unseen. */
export const printProseBench = (bench: ProseBench, details: 'none' | 'open' | 'all' = 'none'): string =>
  [
    scoreTable('All', bench.all),
    scoreTable('Held out', bench.heldOut),
    scoreTable('Open', bench.open),
    scoreTable('Written later', bench.later),
    scoreTable('Never improved on', bench.blind),
    `${WORDS} words: ${bench.times.first.toFixed(1)} ms at first, ${bench.times.keystroke.toFixed(1)} ms after a keystroke`,
    `${bench.generated.sentences} sentences drafted from sound records: ${bench.generated.alarms} alarms`,
    ...(details === 'none' ? [] : [scoreDetails(details === 'open' ? bench.open : bench.all)]),
  ].join('\n\n');

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) {
  const held = process.argv.includes('--held-out');
  const details = process.argv.includes('--verbose') ? (held ? 'all' : 'open') : 'none';
  process.stdout.write(`${printProseBench(benchProse(), details)}\n`);
}
