/** A computed figure: an estimate with its unit, how it came about and what was assumed. */
export interface Figure {
  /** Permanent id of the formula. */
  id: string;
  name: string;
  value?: number;
  low?: number;
  high?: number;
  unit: string;
  /** The formula in words and signs. */
  formula: string;
  inputs: Readonly<Record<string, number | string>>;
  /** What stood in for a fact that is not recorded. */
  assumed: readonly string[];
  source: string;
  /** Fields of the record under which it is shown. */
  fields: readonly string[];
  /** The quiet line under the field. */
  sentence: string;
}
