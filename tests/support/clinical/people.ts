import type { Random } from './random.ts';

const families = [
  'Arkwind',
  'Bramsell',
  'Corvane',
  'Dellmoor',
  'Estrelline',
  'Fennimar',
  'Gorsethwick',
  'Hallowby',
  'Indelmore',
  'Jessaprin',
  'Kestermoor',
  'Lorrimond',
  'Marrowdale',
  'Nettlecroft',
  'Oakenshire',
  'Pellandine',
  'Quillbury',
  'Ravensey',
  'Saltergate',
  'Thistlemere',
  'Umberleaf',
  'Velloway',
  'Wexmoor',
  'Yarrowfen',
] as const;
const given = [
  'Alda',
  'Bertil',
  'Cosima',
  'Dorrit',
  'Edwy',
  'Fenna',
  'Gisla',
  'Hamo',
  'Ilse',
  'Joss',
  'Kezia',
  'Ludo',
  'Mab',
  'Nino',
  'Odo',
  'Perpetua',
  'Quentin',
  'Rosamund',
  'Selwyn',
  'Tamsin',
  'Ulla',
  'Verity',
  'Wystan',
  'Ysolde',
] as const;

/** Invented people only. */
export const familyName = (random: Random): string => random.pick(families);
export const givenName = (random: Random): string => random.pick(given);

/** `count` different names with a title, so that nobody does two jobs by accident. */
export const staff = (random: Random, count: number): string[] =>
  random
    .shuffled(families)
    .slice(0, count)
    .map((name) => `${random.pick(['Dr', 'Dr', 'Professor'])} ${random.pick(given)} ${name}`);
