import { z } from 'zod';

/** One sentence as the templates make it from a record. */
export interface DraftedStatement {
  /** Stable across drafts of the same case: section, name and, in lists, the item. */
  id: string;
  text: string;
  /** Paths of the record that the sentence was made from, in the order of reading. */
  reads: string[];
}

export interface DraftedSection {
  id: string;
  heading: string;
  statements: DraftedStatement[];
}

export interface DraftedTable {
  id: string;
  heading: string;
  columns: string[];
  rows: string[][];
  reads: string[];
}

/** A note or letter as drafted: sections in order, and tables where a table reads better. */
export interface Draft {
  title: string;
  sections: DraftedSection[];
  tables: DraftedTable[];
}

export const origins = ['drafted', 'edited', 'parted', 'deleted', 'own'] as const;

const statement = z.strictObject({
  id: z.string().min(1).max(120),
  /** Drafted; edited; edited while its facts have changed since; taken out; or written by hand. */
  origin: z.enum(origins),
  /** The words that stand in the sheet. Empty when deleted. */
  text: z.string().max(8000),
  /** What the templates say now; empty for an own statement. */
  drafted: z.string().max(8000),
  reads: z.array(z.string().max(200)).max(200),
});

/** A sheet as it is kept: what was drafted and what people made of it. */
export const sheet = z.strictObject({
  title: z.string().max(200),
  sections: z
    .array(
      z.strictObject({
        id: z.string().min(1).max(120),
        heading: z.string().max(200),
        statements: z.array(statement).max(400),
      }),
    )
    .max(60),
});

export type Statement = z.infer<typeof statement>;
export type Sheet = z.infer<typeof sheet>;
export type Origin = (typeof origins)[number];
