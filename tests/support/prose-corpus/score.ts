import { type ProseFinding, type ProseKind, proseKinds } from '../../../src/domain/prose/finding.ts';
import type { CaseRecord } from '../../../src/domain/record/schema.ts';
import { corpusRecord, type RecordName, recordNames } from './records.ts';
import type { Expected, Sample } from './sample.ts';

export type ReadProse = (text: string, record: CaseRecord) => ProseFinding[];

export interface Miss {
  sample: Sample;
  expected: Expected;
  /** The class under which the words were marked all the same. */
  markedAs?: ProseKind;
}

export interface Alarm {
  sample: Sample;
  finding: ProseFinding;
}

export interface ClassScore {
  kind: ProseKind;
  expected: number;
  /** Words marked under their class. */
  found: number;
  /** Words marked under whatever class. */
  marked: number;
  /** Findings of this class in all samples, and those of them that touch no expected words. */
  findings: number;
  falseAlarms: number;
}

export interface Score {
  samples: number;
  classes: ClassScore[];
  total: Omit<ClassScore, 'kind'>;
  misses: Miss[];
  alarms: Alarm[];
}

const touches = (finding: ProseFinding, expected: Expected) =>
  finding.start < expected.end && expected.start < finding.end;

const emptyClass = (kind: ProseKind): ClassScore => ({
  kind,
  expected: 0,
  found: 0,
  marked: 0,
  findings: 0,
  falseAlarms: 0,
});

/** How a reader fares over samples. Words count as marked when a finding touches them. */
export const scoreReader = (readProse: ReadProse, samples: readonly Sample[]): Score => {
  const records = Object.fromEntries(recordNames.map((name) => [name, corpusRecord(name)])) as Record<
    RecordName,
    CaseRecord
  >;
  const byKind = new Map(proseKinds.map((kind) => [kind, emptyClass(kind)]));
  const scoreOf = (kind: ProseKind) => byKind.get(kind) ?? emptyClass(kind);
  const misses: Miss[] = [];
  const alarms: Alarm[] = [];
  for (const sample of samples) {
    const findings = readProse(sample.text, records[sample.record]);
    for (const expected of sample.expect) {
      const score = scoreOf(expected.kind);
      const touching = findings.filter((finding) => touches(finding, expected));
      const sameKind = touching.some((finding) => finding.kind === expected.kind);
      score.expected += 1;
      if (touching.length > 0) score.marked += 1;
      if (sameKind) score.found += 1;
      else {
        const markedAs = touching[0]?.kind;
        misses.push({ sample, expected, ...(markedAs === undefined ? {} : { markedAs }) });
      }
    }
    for (const finding of findings) {
      const score = scoreOf(finding.kind);
      score.findings += 1;
      if (sample.expect.some((expected) => touches(finding, expected))) continue;
      score.falseAlarms += 1;
      alarms.push({ sample, finding });
    }
  }
  const classes = [...byKind.values()];
  const sum = (of: (score: ClassScore) => number) => classes.reduce((total, score) => total + of(score), 0);
  return {
    samples: samples.length,
    classes,
    total: {
      expected: sum((score) => score.expected),
      found: sum((score) => score.found),
      marked: sum((score) => score.marked),
      findings: sum((score) => score.findings),
      falseAlarms: sum((score) => score.falseAlarms),
    },
    misses,
    alarms,
  };
};
