import { describe, expect, it } from 'vitest';
import { type ProseKind, proseKinds } from '../../../src/domain/prose/finding.ts';
import { readProse } from '../../../src/domain/prose/read.ts';
import { corpus } from '../../support/prose-corpus/all.ts';
import { blind } from '../../support/prose-corpus/blind.ts';
import { fresh } from '../../support/prose-corpus/fresh.ts';
import { freshSecond } from '../../support/prose-corpus/fresh-second.ts';
import { type ClassScore, scoreReader } from '../../support/prose-corpus/score.ts';

/** What the reader reaches: of each hundred expected words those found, of each hundred findings those right. */
const floors: Record<ProseKind, { recall: number; precision: number }> = {
  side: { recall: 100, precision: 98 },
  agent: { recall: 98, precision: 97 },
  concentration: { recall: 100, precision: 100 },
  'clock-hour': { recall: 100, precision: 100 },
  quadrant: { recall: 97, precision: 97 },
  length: { recall: 100, precision: 100 },
  count: { recall: 97, precision: 100 },
  material: { recall: 100, precision: 95 },
  lens: { recall: 100, precision: 100 },
  macula: { recall: 97, precision: 100 },
  posture: { recall: 97, precision: 97 },
  duration: { recall: 100, precision: 100 },
  date: { recall: 100, precision: 100 },
  medicine: { recall: 100, precision: 100 },
  negation: { recall: 97, precision: 100 },
};

const everything = [...corpus, ...fresh, ...freshSecond, ...blind];

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
    for (const sample of everything) {
      expect(sample.expect.length > 0, sample.text).toBe(sample.nature === 'fault');
      expect(sample.text).not.toMatch(/\[\[|\]\]/u);
      for (const { words, start, end } of sample.expect) expect(sample.text.slice(start, end)).toBe(words);
    }
  });
});

describe('the reader on the corpus', () => {
  const score = scoreReader(readProse, everything);

  for (const each of score.classes)
    it(`reads ${each.kind} no worse than it did`, () => {
      expect(recall(each)).toBeGreaterThanOrEqual(floors[each.kind].recall);
      expect(precision(each)).toBeGreaterThanOrEqual(floors[each.kind].precision);
    });
});
