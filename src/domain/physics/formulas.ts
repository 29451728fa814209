import { fail, ok, type Result } from '../result.ts';
import { bandFormulas } from './formulas/band.ts';
import { bubbleFormulas } from './formulas/bubble.ts';
import type { Answered, ChoiceInput, Formula, Given, NumberInput } from './formulas/formula.ts';
import { gasFormulas } from './formulas/gas.ts';
import { globeFormulas } from './formulas/globe.ts';

/** Every formula by name: what it is, what it needs, where it comes from. */
export const formulas: Readonly<Record<string, Formula>> = {
  ...globeFormulas,
  ...bandFormulas,
  ...gasFormulas,
  ...bubbleFormulas,
};

const readInput = (
  input: NumberInput | ChoiceInput,
  given: string | number | undefined,
): Result<number | string> => {
  const value = given ?? input.usual;
  if (value === undefined) return fail('missing', `${input.name} is missing`);
  if ('choices' in input) {
    const chosen = input.choices.find((one) => one === String(value));
    return chosen === undefined
      ? fail('unknown', `${input.name} must be one of ${input.choices.join(', ')}`)
      : ok(chosen);
  }
  const written = typeof value === 'number' ? value : Number(value.replace(',', '.'));
  const fits = Number.isFinite(written) && value !== '' && written >= input.min && written <= input.max;
  return fits
    ? ok(written)
    : fail('out-of-range', `${input.name} must be a number from ${input.min} to ${input.max} ${input.unit}`);
};

export interface Computed {
  name: string;
  title: string;
  result: Answered;
  unit: string;
  formula: string;
  inputs: Given;
  source: string;
}

/** Answers one formula. Errors name the formulas, or the inputs with their units and bounds. */
export const compute = (name: string, given: Readonly<Record<string, string | number>>): Result<Computed> => {
  const formula = Object.hasOwn(formulas, name) ? formulas[name] : undefined;
  if (formula === undefined)
    return fail(
      'unknown-formula',
      `There is no formula ${name}; there are ${Object.keys(formulas).join(', ')}`,
    );
  const names = formula.inputs.map((input) => input.name);
  const stranger = Object.keys(given).find((key) => !names.includes(key));
  if (stranger !== undefined)
    return fail('unknown-input', `${name} has no ${stranger}; it takes ${names.join(', ')}`);
  const inputs: Record<string, number | string> = {};
  for (const input of formula.inputs) {
    const read = readInput(input, given[input.name]);
    if (!read.ok) return read;
    inputs[input.name] = read.value;
  }
  const result = formula.compute({ n: (key) => Number(inputs[key]), s: (key) => String(inputs[key]) });
  if (result === undefined) return fail('not-published', `${name} has no published value for these inputs`);
  return ok({
    name,
    title: formula.title,
    result,
    unit: formula.unit,
    formula: formula.formula,
    inputs,
    source: formula.source,
  });
};
