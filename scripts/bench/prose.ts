import { pathToFileURL } from 'node:url';
import { readProse } from '../../src/domain/prose/read.ts';
import { corpus } from '../../tests/support/prose-corpus/all.ts';
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

/** Milliseconds in which a text of 2,000 words is read: the median of several runs, the first ones left out. */
export const readingTime = (): number => {
  const words = corpus
    .filter((sample) => sample.record === 'gasRight')
    .flatMap((sample) => (/[.!?]$/u.test(sample.text) ? sample.text : `${sample.text}.`).split(' '));
  const text = Array.from({ length: WORDS }, (_, at) => words[at % words.length]).join(' ');
  const record = corpusRecord('gasRight');
  const times = Array.from({ length: RUNS }, () => {
    const from = performance.now();
    readProse(text, record);
    return performance.now() - from;
  });
  return times.slice(5).sort((a, b) => a - b)[(RUNS - 5) >> 1] ?? 0;
};

export interface ProseBench {
  all: Score;
  heldOut: Score;
  open: Score;
  readingMilliseconds: number;
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
  readingMilliseconds: readingTime(),
});

/** The bench as Markdown. With details, the misses and alarms of the open two thirds; the rest stays unseen. */
export const printProseBench = (bench: ProseBench, details: 'none' | 'open' | 'all' = 'none'): string =>
  [
    scoreTable('All', bench.all),
    scoreTable('Held out', bench.heldOut),
    scoreTable('Open', bench.open),
    `${WORDS} words read in ${bench.readingMilliseconds.toFixed(1)} ms`,
    ...(details === 'none' ? [] : [scoreDetails(details === 'open' ? bench.open : bench.all)]),
  ].join('\n\n');

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) {
  const held = process.argv.includes('--held-out');
  const details = process.argv.includes('--verbose') ? (held ? 'all' : 'open') : 'none';
  process.stdout.write(`${printProseBench(benchProse(), details)}\n`);
}
