import { canonical } from './canonical.ts';

/** An entry of the log as it is hashed. `position` counts from 1, `at` is an instant, ISO 8601 in UTC. */
export interface Entry {
  position: number;
  at: string;
  personId: string | null;
  action: string;
  subject: string;
  detail: Readonly<Record<string, string | number | boolean>>;
  /** Hash of the entry before; that of the first is `GENESIS`. */
  previousHash: string;
}

export interface Link {
  entry: Entry;
  /** SHA-256 of the entry's text, in hexadecimal. */
  hash: string;
}

export const GENESIS = '0'.repeat(64);

/** What is hashed of an entry. */
export const textOf = (entry: Entry): string => canonical(entry);

/** Where the chain goes on: the last position that holds, and its hash. */
export interface End {
  position: number;
  hash: string;
}

export const START: End = { position: 0, hash: GENESIS };

/**
 * Follows links from an end: the new end, or the first position where something was changed, put in, taken out or moved.
 * Links that are missing after the last one cannot be seen from the chain alone; whoever kept an earlier end can see it.
 */
export const follow = (
  end: End,
  links: readonly Link[],
  sha256: (text: string) => string,
): { holds: true; end: End } | { holds: false; position: number } => {
  let { position, hash } = end;
  for (const link of links) {
    const isNext = link.entry.position === position + 1 && link.entry.previousHash === hash;
    if (!isNext || link.hash !== sha256(textOf(link.entry))) return { holds: false, position: position + 1 };
    position += 1;
    hash = link.hash;
  }
  return { holds: true, end: { position, hash } };
};
