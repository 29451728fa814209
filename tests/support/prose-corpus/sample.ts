import type { ProseKind } from '../../../src/domain/prose/finding.ts';
import type { RecordName } from './records.ts';

export type Nature = 'fault' | 'clean' | 'trap';

/** A place in a sentence that the record denies. */
export interface Expected {
  kind: ProseKind;
  /** The words that must be marked, at least in part. */
  words: string;
  start: number;
  end: number;
}

export interface Sample {
  class: ProseKind;
  nature: Nature;
  record: RecordName;
  text: string;
  expect: Expected[];
  /** Kept apart from those by which the reader is improved. */
  heldOut: boolean;
}

export type Sentences = Partial<
  Record<RecordName, { faults?: string[]; clean?: string[]; traps?: string[] }>
>;

const MARK = /\[\[(?:([a-z-]+)=)?(.*?)\]\]/gu;

const unmark = (marked: string, sampleClass: ProseKind): { text: string; expect: Expected[] } => {
  const expect: Expected[] = [];
  let text = '';
  let from = 0;
  for (const match of marked.matchAll(MARK)) {
    const words = match[2] ?? '';
    text += marked.slice(from, match.index);
    expect.push({
      kind: (match[1] ?? sampleClass) as ProseKind,
      words,
      start: text.length,
      end: text.length + words.length,
    });
    text += words;
    from = match.index + match[0].length;
  }
  return { text: text + marked.slice(from), expect };
};

/** One in three, by the sentence alone, so that adding a sentence moves no other. */
const isHeldOut = (text: string) => {
  let hash = 2166136261;
  for (const unit of text) hash = Math.imul(hash ^ (unit.codePointAt(0) ?? 0), 16777619);
  return (hash >>> 8) % 3 === 0;
};

/**
 * Samples of one class. In a sentence `[[words]]` are those that the record denies, `[[agent=words]]` those of another
 * class than that of the list.
 */
export const samplesOf = (sampleClass: ProseKind, sentences: Sentences): Sample[] =>
  (Object.keys(sentences) as RecordName[]).flatMap((record) => {
    const lists = sentences[record] ?? {};
    const make = (nature: Nature, list: string[] = []) =>
      list.map((marked): Sample => {
        const { text, expect } = unmark(marked, sampleClass);
        return { class: sampleClass, nature, record, text, expect, heldOut: isHeldOut(text) };
      });
    return [...make('fault', lists.faults), ...make('clean', lists.clean), ...make('trap', lists.traps)];
  });
