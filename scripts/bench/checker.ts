import { pathToFileURL } from 'node:url';
import { checkRecord } from '../../src/domain/checks/engine.ts';
import { type Flag, flagKey, type Level, levels } from '../../src/domain/checks/flag.ts';
import { covers, valueAt } from '../../src/domain/record/paths.ts';
import type { CaseRecord } from '../../src/domain/record/schema.ts';
import { type Fault, faults } from '../../tests/support/clinical/faults.ts';
import { cleanRecord, fieldsOf } from '../../tests/support/clinical/generate.ts';
import { randomFrom } from '../../tests/support/clinical/random.ts';

/** How one fault fared over the records in which it was put. */
export interface FaultOutcome {
  id: string;
  family: string;
  level: Level;
  describe: string;
  applied: number;
  /** Records in which a new flag points at the changed fields or their group. */
  found: number;
  /** Records in which only flags elsewhere are new. */
  elsewhere: number;
  /** Records in which a new flag there is at least as grave as expected. */
  graveEnough: number;
  rules: string[];
  /** Numbers of the clean records in which the fault was missed. */
  missedIn: number[];
}

export interface CheckerBench {
  records: number;
  faults: FaultOutcome[];
  /** Flags on sound records, per thousand records. */
  falseFlags: Record<Level, number>;
  /** Sound records with at least one flag, per thousand. */
  recordsFlagged: Record<Level, number>;
  offenders: { rule: string; level: Level; count: number; example: { record: number; message: string } }[];
}

const TRIES = 25;

/** Fields that differ between two records. */
const changedFields = (before: CaseRecord, after: CaseRecord): string[] =>
  [...new Set([...fieldsOf(before), ...fieldsOf(after)])].filter(
    (path) => JSON.stringify(valueAt(before, path)) !== JSON.stringify(valueAt(after, path)),
  );

const groupOf = (path: string) => path.split('.').slice(0, -1).join('.');

const pointsAt = (flag: Flag, changed: readonly string[]) =>
  flag.fields.some((field) =>
    changed.some((path) => covers(field, path) || covers(path, field) || groupOf(field) === groupOf(path)),
  );

const tryFault = (fault: Fault, sound: readonly Sound[], seed: number) => {
  const outcome: FaultOutcome = {
    id: fault.id,
    family: fault.family,
    level: fault.level,
    describe: fault.describe,
    applied: 0,
    found: 0,
    elsewhere: 0,
    graveEnough: 0,
    rules: [],
    missedIn: [],
  };
  const rules = new Set<string>();
  for (const [at, { record, flags }] of sound.entries()) {
    if (outcome.applied >= TRIES) break;
    const faulty = fault.apply(record, randomFrom(seed + at));
    if (faulty === null) continue;
    outcome.applied += 1;
    const known = new Set(flags.map(flagKey));
    const fresh = checkRecord(faulty).filter((flag) => !known.has(flagKey(flag)));
    const changed = changedFields(record, faulty);
    const there = fresh.filter((flag) => pointsAt(flag, changed));
    for (const flag of there) rules.add(flag.rule);
    if (there.length > 0) outcome.found += 1;
    else {
      outcome.missedIn.push(seed + at);
      if (fresh.length > 0) outcome.elsewhere += 1;
    }
    if (there.some((flag) => levels.indexOf(flag.level) <= levels.indexOf(fault.level)))
      outcome.graveEnough += 1;
  }
  return { ...outcome, rules: [...rules].sort() };
};

const perThousand = (count: number, records: number) => Math.round((count / records) * 100_000) / 100;

interface Sound {
  record: CaseRecord;
  flags: Flag[];
}

const soundRecords = (records: number, seed: number): Sound[] =>
  Array.from({ length: records }, (_, at) => {
    const record = cleanRecord(seed + at);
    return { record, flags: checkRecord(record) };
  });

const alarmsIn = (sound: readonly Sound[], seed: number): Omit<CheckerBench, 'faults'> => {
  const count = (tally: (flags: Flag[], level: Level) => number): Record<Level, number> => {
    const of = (level: Level) =>
      perThousand(
        sound.reduce((sum, { flags }) => sum + tally(flags, level), 0),
        sound.length,
      );
    return { contradiction: of('contradiction'), omission: of('omission'), caution: of('caution') };
  };
  const offenders = new Map<string, CheckerBench['offenders'][number]>();
  for (const [at, { flags }] of sound.entries()) {
    for (const { rule, level, message } of flags) {
      const known = offenders.get(rule);
      if (known === undefined)
        offenders.set(rule, { rule, level, count: 1, example: { record: seed + at, message } });
      else known.count += 1;
    }
  }
  return {
    records: sound.length,
    falseFlags: count((flags, level) => flags.filter((flag) => flag.level === level).length),
    recordsFlagged: count((flags, level) => (flags.some((flag) => flag.level === level) ? 1 : 0)),
    offenders: [...offenders.values()].sort((a, b) => b.count - a.count),
  };
};

/** What the checker says of sound records alone. */
export const falseAlarms = ({
  records,
  seed,
}: {
  records: number;
  seed: number;
}): Omit<CheckerBench, 'faults'> => alarmsIn(soundRecords(records, seed), seed);

/** Puts every fault into sound records and counts what the checker finds, and what it says of sound ones. */
export const benchChecker = ({ records, seed }: { records: number; seed: number }): CheckerBench => {
  const sound = soundRecords(records, seed);
  return { ...alarmsIn(sound, seed), faults: faults.map((fault) => tryFault(fault, sound, seed)) };
};

const line = (cells: readonly (string | number)[]) => cells.map(String).join('\t');

/** The bench as text, the worst first. */
export const printBench = (bench: CheckerBench): string => {
  const applied = bench.faults.filter((fault) => fault.applied > 0);
  const complete = applied.filter((fault) => fault.found + fault.elsewhere === fault.applied);
  const trials = applied.reduce((sum, fault) => sum + fault.applied, 0);
  const hits = applied.reduce((sum, fault) => sum + fault.found + fault.elsewhere, 0);
  const short = applied
    .filter((fault) => fault.found < fault.applied)
    .sort((a, b) => a.found / a.applied - b.found / b.applied);
  const mild = applied.filter((fault) => fault.found > 0 && fault.graveEnough < fault.found);
  return [
    `Sound records: ${bench.records}`,
    line(['level', 'flags per 1,000', 'records flagged per 1,000']),
    ...levels.map((level) => line([level, bench.falseFlags[level], bench.recordsFlagged[level]])),
    '',
    'Rules that speak on sound records',
    ...bench.offenders.map((o) =>
      line([o.count, o.level, o.rule, `record ${o.example.record}: ${o.example.message}`]),
    ),
    '',
    `Faults: ${applied.length} put in, ${complete.length} found every time, ${trials} trials, ${hits} found (${((hits / trials) * 100).toFixed(1)}%)`,
    '',
    'Faults missed, wholly or in part: fault, expected level, found of put in, flagged elsewhere only, rules, missed in',
    ...short.map((f) =>
      line([
        `${f.family}/${f.id}`,
        f.level,
        `${f.found}/${f.applied}`,
        f.elsewhere,
        f.rules.join(',') || '-',
        f.missedIn.slice(0, 3).join(','),
        f.describe,
      ]),
    ),
    '',
    'Faults found at a milder level than expected',
    ...mild.map((f) =>
      line([`${f.family}/${f.id}`, f.level, `${f.graveEnough}/${f.found}`, f.rules.join(',')]),
    ),
    '',
    'Faults never put in',
    ...bench.faults.filter((fault) => fault.applied === 0).map((fault) => fault.id),
  ].join('\n');
};

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) {
  process.stdout.write(`${printBench(benchChecker({ records: 2000, seed: 10_000 }))}\n`);
}
