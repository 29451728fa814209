import type { CaseRecord } from '../../record/schema.ts';

/** A course of drops or tablets, or a medicine given at the end, under the names by which it is written. */
export interface Course {
  names: readonly string[];
  /** Path of the recorded item. */
  field: string;
  given: boolean;
  strength?: string | undefined;
  timesADay?: number | undefined;
  weeks?: number | undefined;
  dose?: string | undefined;
  route?: string | undefined;
}

const shortNames: Readonly<Record<string, readonly string[]>> = {
  chloramphenicol: ['chloramph', 'chlor'],
  dexamethasone: ['dexameth', 'dex'],
  prednisolone: ['pred'],
  cyclopentolate: ['cyclo'],
  acetazolamide: ['acetaz'],
  cefuroxime: ['cef'],
  triamcinolone: ['triam', 'ta'],
};

const namesOf = (drug: string | undefined): string[] => {
  const first = drug?.toLowerCase().split(/\s+/)[0];
  return first === undefined || first.length < 3 ? [] : [first, ...(shortNames[first] ?? [])];
};

/** Every recorded drop, tablet and medicine given. */
export const coursesOf = (record: CaseRecord): Course[] => {
  const { drops, tablets } = record.aftercare ?? {};
  const medicines = record.endOfCase?.medicines;
  return [
    ...(Array.isArray(drops)
      ? drops.map((one, at) => ({
          ...one,
          names: namesOf(one.drug),
          field: `aftercare.drops.${at}`,
          given: false,
        }))
      : []),
    ...(Array.isArray(tablets)
      ? tablets.map((one, at) => ({
          ...one,
          names: namesOf(one.drug),
          field: `aftercare.tablets.${at}`,
          given: false,
        }))
      : []),
    ...(Array.isArray(medicines)
      ? medicines.map((one, at) => ({
          ...one,
          names: namesOf(one.drug),
          field: `endOfCase.medicines.${at}`,
          given: true,
        }))
      : []),
  ];
};

export interface Named {
  course: Course;
  at: number;
}

const letters = /[a-z]/;

/** Where courses are named in a clause, in order; a name is a whole word. */
export const namedIn = (plain: string, courses: readonly Course[]): Named[] => {
  const found: Named[] = [];
  for (const course of courses)
    for (const name of course.names) {
      let at = plain.indexOf(name);
      while (at >= 0) {
        const whole = !letters.test(plain.charAt(at - 1)) && !letters.test(plain.charAt(at + name.length));
        if (whole) {
          found.push({ course, at });
          break;
        }
        at = plain.indexOf(name, at + 1);
      }
      if (found.at(-1)?.course === course) break;
    }
  return found.sort((a, b) => a.at - b.at);
};

/** The drop or tablet named last before a place. */
export const courseAt = (plain: string, index: number, courses: readonly Course[]): Named | undefined =>
  namedIn(
    plain.slice(0, index),
    courses.filter(({ given }) => !given),
  ).at(-1);
