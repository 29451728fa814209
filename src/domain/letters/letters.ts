import { draftFrom } from '../drafting/draft.ts';
import type { Draft } from '../drafting/sheet.ts';
import type { CaseRecord } from '../record/schema.ts';

/** The kinds of letter and what they are called. */
export const letterKinds = {
  'referring-doctor': 'Letter to the referring doctor',
  'family-doctor': 'Letter to the family doctor',
  patient: 'Letter to the patient',
} as const;

export type LetterKind = keyof typeof letterKinds;

export const isLetterKind = (kind: string): kind is LetterKind => Object.hasOwn(letterKinds, kind);

const readers: Readonly<Record<LetterKind, (record: CaseRecord) => string>> = {
  'referring-doctor': ({ who }) => who?.referrer?.name ?? 'colleague',
  'family-doctor': ({ who }) => who?.familyDoctor ?? 'colleague',
  patient: ({ who }) =>
    [who?.patient?.givenName, who?.patient?.familyName].filter((name) => name !== undefined).join(' ') ||
    'patient',
};

/** Drafts one kind of letter from a record. */
export const draftLetter = (kind: LetterKind, record: CaseRecord): Draft =>
  draftFrom(kind, letterKinds[kind], record, { reader: readers[kind](record) });

/** Who needs a letter about this case: the referrer unless the patient came alone, the family doctor who is named, the patient. */
export const letterKindsFor = ({ who }: CaseRecord): LetterKind[] => {
  const referred = who?.referrer?.kind !== 'self' && who?.referrer?.name !== undefined;
  const isSame = who?.familyDoctor !== undefined && who.familyDoctor === who.referrer?.name;
  return [
    ...(referred || who?.familyDoctor === undefined ? (['referring-doctor'] as const) : []),
    ...(who?.familyDoctor !== undefined && !isSame ? (['family-doctor'] as const) : []),
    'patient',
  ];
};
