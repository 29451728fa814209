/** Share of the first strength, from 0 to 1, that is left of a suture; a range where the sources leave one. */
export interface Strength {
  low: number;
  high: number;
}

type Curve = readonly (readonly [day: number, share: number])[];

/** Published points (read); between them the truth lies between the neighbours. */
const curves: Readonly<Record<string, Curve>> = {
  'polyglactin-910': [
    [0, 1],
    [28, 0.25],
    [35, 0],
  ],
  polydioxanone: [
    [0, 1],
    [28, 0.5],
    [42, 0.25],
    [180, 0],
  ],
};

const lasting = new Set(['nylon', 'polyester', 'polypropylene', 'silicone', 'metal']);

export const isAbsorbable = (material: string): boolean => material in curves;

/**
 * Strength left on a day after surgery. Polyglactin 910: 25% at 4 weeks, none by week 5; polydioxanone: 50% at 4 weeks, 25% at 6,
 * absorbed by 6 to 7 months (read). Others last (common practice). `undefined` for an unknown material.
 */
export const strengthLeft = (material: string, day: number): Strength | undefined => {
  if (lasting.has(material)) return { low: 1, high: 1 };
  const curve = curves[material];
  if (curve === undefined || day < 0) return undefined;
  const known = curve.find(([at]) => at === day);
  if (known !== undefined) return { low: known[1], high: known[1] };
  const before = curve.findLast(([at]) => at < day);
  const after = curve.find(([at]) => at > day);
  return { low: after?.[1] ?? 0, high: after === undefined ? 0 : (before?.[1] ?? 1) };
};
