import { createHash } from 'node:crypto';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type Entry, follow, type Link, START, textOf } from '../../../src/domain/signing/chain.ts';

const sha256 = (text: string) => createHash('sha256').update(text).digest('hex');

const chainOf = (actions: readonly string[]): Link[] => {
  const links: Link[] = [];
  let end = START;
  for (const action of actions) {
    const entry: Entry = {
      position: end.position + 1,
      at: '2026-12-01T10:42:00.000Z',
      personId: null,
      action,
      subject: 'case',
      detail: { revision: end.position },
      previousHash: end.hash,
    };
    const link = { entry, hash: sha256(textOf(entry)) };
    links.push(link);
    end = { position: entry.position, hash: link.hash };
  }
  return links;
};

const walk = (links: readonly Link[]) => follow(START, links, sha256);
const actions = fc.array(fc.string(), { minLength: 2, maxLength: 12 });

/** A chain, and a place in it. */
const chainWithPlace = actions.chain((list) =>
  fc.record({
    links: fc.constant(chainOf(list)),
    at: fc.integer({ min: 0, max: list.length - 1 }),
  }),
);

describe('a chain', () => {
  it('holds as it was appended, in one go or in parts', () => {
    fc.assert(
      fc.property(chainWithPlace, ({ links, at }) => {
        const whole = walk(links);
        const first = walk(links.slice(0, at));
        expect(whole).toMatchObject({ holds: true, end: { position: links.length } });
        if (!first.holds) throw new Error('The first part does not hold.');
        expect(follow(first.end, links.slice(at), sha256)).toEqual(whole);
      }),
    );
  });

  it('shows where a fact was changed', () => {
    const changes: readonly ((entry: Entry) => Entry)[] = [
      (entry) => ({ ...entry, at: '2026-12-01T10:42:00.001Z' }),
      (entry) => ({ ...entry, personId: 'somebody' }),
      (entry) => ({ ...entry, action: `${entry.action}.` }),
      (entry) => ({ ...entry, subject: 'another case' }),
      (entry) => ({ ...entry, detail: {} }),
    ];
    fc.assert(
      fc.property(chainWithPlace, fc.constantFrom(...changes), ({ links, at }, change) => {
        const tampered = links.map((link, index) =>
          index === at ? { ...link, entry: change(link.entry) } : link,
        );
        expect(walk(tampered)).toEqual({ holds: false, position: at + 1 });
      }),
    );
  });

  it('shows where an entry was changed together with its own hash, by the next one', () => {
    fc.assert(
      fc.property(chainWithPlace, ({ links, at }) => {
        fc.pre(at < links.length - 1);
        const tampered = links.map((link, index) => {
          if (index !== at) return link;
          const entry = { ...link.entry, subject: 'another case' };
          return { entry, hash: sha256(textOf(entry)) };
        });
        expect(walk(tampered)).toEqual({ holds: false, position: at + 2 });
      }),
    );
  });

  it('shows where an entry was taken out, put in twice, or moved', () => {
    fc.assert(
      fc.property(chainWithPlace, ({ links, at }) => {
        fc.pre(at < links.length - 1);
        const [here, next] = links.slice(at, at + 2);
        if (here === undefined || next === undefined) throw new Error('There is no next entry.');
        const before = links.slice(0, at);
        const after = links.slice(at + 2);
        expect(walk([...before, next, ...after])).toEqual({ holds: false, position: at + 1 });
        expect(walk([...before, next, here, ...after])).toEqual({ holds: false, position: at + 1 });
        expect(walk([...before, here, here, next, ...after])).toEqual({ holds: false, position: at + 2 });
      }),
    );
  });

  it('cannot show that its last entries are missing; an end that was kept can', () => {
    const links = chainOf(['a', 'b', 'c']);
    const cut = walk(links.slice(0, 2));
    expect(cut.holds).toBe(true);
    expect(cut).not.toEqual(walk(links));
  });
});
