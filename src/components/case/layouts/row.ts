/**
 * How the fields of a group stand on the page. A layout only places fields: every field of the record that no row
 * names is shown below under "more", so that none is out of reach.
 */
export interface Row {
  /** Title at the left; without it, that of the first field. */
  label?: string;
  /** Names of fields of the group, side by side. */
  fields: readonly string[];
  /** Words between the fields: the first stands before the first field. */
  between?: readonly string[];
  /** Fields whose unit is printed by a later field of the row. */
  unitless?: readonly string[];
  /** Room for a box, in characters, where the usual room is wrong. */
  sizes?: Readonly<Record<string, number>>;
  /** Shorter labels where the row says the rest. */
  short?: Readonly<Record<string, string>>;
  /** A field elsewhere whose value may be said again with one press, and the words for it. */
  sameAs?: { path: string; words: string };
  /** Whether the row is of use, given the other values of the group. A row with something recorded is always shown. */
  when?: (value: (name: string) => unknown) => boolean;
}

export interface Layout {
  usual: readonly Row[];
  /** Shown on request. */
  more?: readonly Row[];
}

/** A row for each field. */
export const one = (...names: string[]): Row[] => names.map((name) => ({ fields: [name] }));

/** Of use while another field of the group has one of these values. */
export const is =
  (name: string, ...wanted: unknown[]): NonNullable<Row['when']> =>
  (value) =>
    wanted.includes(value(name));

/** Of use unless another field of the group has one of these values. */
export const isNot =
  (name: string, ...unwanted: unknown[]): NonNullable<Row['when']> =>
  (value) =>
    !unwanted.includes(value(name));
