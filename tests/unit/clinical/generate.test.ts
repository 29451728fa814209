import { describe, expect, it } from 'vitest';
import { readRecord } from '../../../src/domain/record/read.ts';
import type { CaseRecord } from '../../../src/domain/record/schema.ts';
import { holds } from '../../support/clinical/breaks.ts';
import { cleanRecord, fieldsOf, incomplete, scenarioOf } from '../../support/clinical/generate.ts';
import {
  bubbleHalfArc,
  circumferenceMm,
  equatorMm,
  fromTop,
  insertionMm,
} from '../../support/clinical/globe.ts';
import { oddities } from '../../support/clinical/oddities.ts';
import { planFrom } from '../../support/clinical/plan.ts';
import { randomFrom } from '../../support/clinical/random.ts';
import { scenarios } from '../../support/clinical/scenarios.ts';

const COUNT = 2000;
const records = Array.from({ length: COUNT }, (_, start) => cleanRecord(start));
const listed = <T>(list: T[] | 'none' | undefined): T[] => (Array.isArray(list) ? list : []);
const found = (record: CaseRecord) => listed(record.breaks?.found);
const elements = (record: CaseRecord) => listed(record.buckle?.elements);
const shareOf = (test: (record: CaseRecord) => boolean) => records.filter(test).length / COUNT;
const values = <T>(read: (record: CaseRecord) => T | T[]) =>
  new Set(records.flatMap((record) => read(record)));

describe('the geometry of the generated cases', () => {
  it('has the recti where they are, and interpolates between them', () => {
    expect([12, 3, 6, 9].map((clock) => insertionMm(clock, 'right'))).toEqual([7.7, 5.5, 6.5, 6.9]);
    expect([3, 9].map((clock) => insertionMm(clock, 'left'))).toEqual([6.9, 5.5]);
    expect(insertionMm(1.5, 'right')).toBeCloseTo(6.6);
    expect(insertionMm(10.5, 'right')).toBeCloseTo(7.3);
  });

  it('measures a 24 mm eye as published', () => {
    expect(equatorMm(24)).toBeGreaterThan(12.4);
    expect(equatorMm(24)).toBeLessThan(13);
    expect(circumferenceMm(24, equatorMm(24))).toBeCloseTo(75.4, 1);
  });

  it('turns the temporal side of a right eye up when lying on the left side', () => {
    expect(fromTop('left-side', { clock: 9, mm: equatorMm(24) }, 24)).toBeCloseTo(0, 5);
    expect(fromTop('right-side', { clock: 9, mm: equatorMm(24) }, 24)).toBeCloseTo(180, 5);
    expect(fromTop('upright', { clock: 6, mm: equatorMm(24) }, 24)).toBeCloseTo(180, 5);
  });

  it('wets half the wall when half full', () => {
    expect(bubbleHalfArc(0.5)).toBeCloseTo(90, 3);
  });
});

describe('generated records', () => {
  it('all pass the reader unchanged', () => {
    for (const record of records) expect(readRecord(record)).toEqual({ ok: true, value: record });
  });

  it('are the same for the same number', () => {
    for (const start of [0, 7, 1999]) expect(cleanRecord(start)).toEqual(records[start]);
    expect(new Set(records.map((record) => JSON.stringify(record))).size).toBe(COUNT);
  });

  it('cover every kind of operation', () => {
    const seen = new Set(records.map((_, start) => scenarioOf(start)));
    expect([...seen].sort()).toEqual(scenarios.map(([, scenario]) => scenario.name).sort());
  });

  it('cover every agent, kind of break, role, form, lens, block and grade that is used', () => {
    expect(values((r) => r.tamponade?.agent)).toEqual(
      new Set(['none', 'air', 'SF6', 'C2F6', 'C3F8', 'silicone-oil', 'heavy-oil']),
    );
    expect(values((r) => found(r).map((b) => b.kind))).toEqual(
      new Set(['horseshoe', 'round-hole', 'operculated', 'dialysis', 'giant-tear', 'macular-hole']),
    );
    expect(values((r) => elements(r).map((e) => e.role))).toEqual(
      new Set(['encircling', 'segment', 'meridional', 'under-band']),
    );
    expect(values((r) => elements(r).map((e) => e.form))).toEqual(
      new Set(['band', 'strip', 'tyre', 'round-sponge', 'oval-sponge', 'wedge']),
    );
    expect(values((r) => r.before?.lens)).toEqual(new Set(['phakic', 'cataract', 'pseudophakic', 'aphakic']));
    expect(values((r) => r.anaesthesia?.kind)).toEqual(
      new Set(['general', 'sub-tenon', 'peribulbar', 'retrobulbar', 'topical']),
    );
    expect(values((r) => r.before?.diagnosis).size).toBe(6);
    expect(values((r) => r.before?.pvr?.grade).size).toBeGreaterThanOrEqual(9);
    expect(values((r) => listed(r.aftercare?.posture).map((p) => p.position)).size).toBeGreaterThanOrEqual(7);
    expect(values((r) => r.drainage?.kind)).toEqual(new Set(['none', 'external', 'internal']));
    expect(values((r) => r.vitreous?.heavyLiquid)).toEqual(new Set(['none', 'removed', 'left']));
  });

  it('are of both eyes, all ages and all sizes', () => {
    expect(shareOf((r) => r.who?.eye === 'right')).toBeCloseTo(0.5, 1);
    expect(shareOf((r) => (r.before?.axialLengthMm ?? 24) > 28)).toBeGreaterThan(0.04);
    expect(shareOf((r) => (r.before?.axialLengthMm ?? 24) < 22.5)).toBeGreaterThan(0.02);
    expect(shareOf((r) => found(r).length >= 4)).toBeGreaterThan(0.03);
    expect(shareOf((r) => r.before?.recurrent === true)).toBeGreaterThan(0.05);
    const ages = Array.from({ length: COUNT }, (_, start) => planFrom(start).age);
    expect(Math.min(...ages)).toBeLessThan(15);
    expect(Math.max(...ages)).toBeGreaterThan(83);
  });

  it('name an element only where it really holds the break', () => {
    for (const [start, record] of records.entries()) {
      const plan = planFrom(start);
      for (const [at, held] of plan.breaks.entries()) {
        const named = found(record)[at]?.supportedByElements;
        for (const number of Array.isArray(named) ? named : []) {
          const element = elements(record)[number - 1];
          expect(
            element !== undefined && holds(element, held, plan.eye, plan.axialLengthMm),
            `${start}`,
          ).toBe(true);
        }
      }
    }
  });

  it('hold every leading break of a buckle without vitrectomy', () => {
    for (const record of records) {
      if (record.vitreous?.vitrectomy !== false || elements(record).length === 0) continue;
      expect(found(record)[0]?.supportedByElements).not.toBe('none');
    }
  });

  it('stay in the family: every odd thing turns up now and then, and none is the rule', () => {
    for (const oddity of oddities) {
      const shown = records.filter((record, start) => oddity.apply(record, planFrom(start)) !== undefined);
      expect(shown.length, oddity.name).toBeGreaterThan(0);
      expect(oddity.share, oddity.name).toBeLessThanOrEqual(0.5);
    }
    expect(shareOf((r) => r.endOfCase?.complications !== 'none')).toBeLessThan(0.1);
  });
});

describe('records still being filled in', () => {
  it('pass the reader, hold nothing new, and lack something', () => {
    for (const [start, record] of records.slice(0, 400).entries()) {
      const partial = incomplete(record, randomFrom(start));
      expect(readRecord(partial).ok, `${start}`).toBe(true);
      expect(fieldsOf(partial).length).toBeLessThanOrEqual(fieldsOf(record).length);
    }
  });
});
