import { describe, expect, it } from 'vitest';
import { type ProseKind, proseKinds } from '../../../src/domain/prose/finding.ts';
import { readProse } from '../../../src/domain/prose/read.ts';
import { corpus } from '../../support/prose-corpus/all.ts';
import { type ClassScore, scoreReader } from '../../support/prose-corpus/score.ts';

/** What the reader reaches: of each hundred expected words those found, of each hundred findings those right. */
const floors: Record<ProseKind, { recall: number; precision: number }> = {
  side: { recall: 96, precision: 65 },
  agent: { recall: 79, precision: 81 },
  concentration: { recall: 85, precision: 95 },
  'clock-hour': { recall: 56, precision: 96 },
  quadrant: { recall: 48, precision: 85 },
  length: { recall: 55, precision: 90 },
  count: { recall: 39, precision: 93 },
  material: { recall: 32, precision: 76 },
  lens: { recall: 47, precision: 81 },
  macula: { recall: 74, precision: 88 },
  posture: { recall: 83, precision: 74 },
  duration: { recall: 27, precision: 100 },
  date: { recall: 32, precision: 92 },
  medicine: { recall: 52, precision: 96 },
  negation: { recall: 26, precision: 80 },
};

const recall = ({ found, expected }: Pick<ClassScore, 'found' | 'expected'>) => (found / expected) * 100;

const precision = ({ findings, falseAlarms }: Pick<ClassScore, 'findings' | 'falseAlarms'>) =>
  ((findings - falseAlarms) / findings) * 100;

describe('the corpus', () => {
  it('holds at least 600 different sentences, with faults, clean ones and traps in every class', () => {
    expect(new Set(corpus.map(({ record, text }) => `${record} ${text}`)).size).toBeGreaterThanOrEqual(600);
    for (const kind of proseKinds)
      for (const nature of ['fault', 'clean', 'trap'])
        expect(
          corpus.filter((sample) => sample.class === kind && sample.nature === nature).length,
          `${kind}, ${nature}`,
        ).toBeGreaterThanOrEqual(8);
  });

  it('marks words in faults and in nothing else', () => {
    for (const sample of corpus) {
      expect(sample.expect.length > 0, sample.text).toBe(sample.nature === 'fault');
      expect(sample.text).not.toMatch(/\[\[|\]\]/u);
      for (const { words, start, end } of sample.expect) expect(sample.text.slice(start, end)).toBe(words);
    }
  });
});

describe('the reader on the corpus', () => {
  const score = scoreReader(readProse, corpus);

  for (const each of score.classes)
    it(`reads ${each.kind} no worse than it did`, () => {
      expect(recall(each)).toBeGreaterThanOrEqual(floors[each.kind].recall);
      expect(precision(each)).toBeGreaterThanOrEqual(floors[each.kind].precision);
    });
});
