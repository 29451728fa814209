import type Handlebars from 'handlebars/runtime';
import { clockwise } from '../anatomy/clock.ts';
import { gasFacts, isGas, spanDays } from '../physics/gas.ts';
import { publishedBand } from '../physics/refraction.ts';
import type { BuckleElement, CaseRecord, Fixation } from '../record/schema.ts';
import {
  clockWords,
  countWords,
  dateWords,
  labelOf,
  listWords,
  lowerFirst,
  numberWords,
  timesWords,
  timeWords,
  withArticle,
} from './words.ts';

type Helper = (...given: never[]) => unknown;

const isText = (value: unknown): value is string => typeof value === 'string' && value !== '';
const isNumber = (value: unknown): value is number => typeof value === 'number';
const isList = (value: unknown): value is readonly unknown[] => Array.isArray(value);

/** What Handlebars adds at the end is not one of the values. */
const values = (given: readonly unknown[]) => given.slice(0, -1);

const labels = (path: string, chosen: unknown): string[] =>
  isList(chosen) ? chosen.filter(isText).map((value) => labelOf(path, value)) : [];

/** "one 5-0 nylon mattress suture in each quadrant", "scleral tunnels in the superotemporal and superonasal quadrants". */
const fixationWords = (fixation: unknown): string => {
  if (!isList(fixation)) return '';
  const all = fixation as readonly Fixation[];
  const groups = new Map<string, string[]>();
  for (const { kind, material, gauge, quadrant } of all) {
    const parts = [
      isText(gauge) && gauge !== 'not-applicable' ? gauge : '',
      isText(material) && material !== 'not-applicable'
        ? labelOf('buckle.elements.fixation.material', material)
        : '',
      kind === undefined ? 'fixation' : labelOf('buckle.elements.fixation.kind', kind),
    ];
    const name = parts.filter((part) => part !== '').join(' ');
    groups.set(name, [...(groups.get(name) ?? []), quadrant ?? '']);
  }
  return listWords(
    [...groups].map(([name, where]) => {
      const places = [...new Set(where.filter(isText))];
      if (places.length === 4 && where.length === 4) return `one ${name} in each quadrant`;
      const counted = where.length === 1 ? withArticle(name) : `${countWords(where.length)} ${name}s`;
      if (places.length === 0) return counted;
      return `${counted} in the ${listWords(places)} ${places.length === 1 ? 'quadrant' : 'quadrants'}`;
    }),
  );
};

/** "3.5 × 0.75 mm solid silicone band". */
const elementWords = (element: unknown): string => {
  if (typeof element !== 'object' || element === null) return '';
  const { widthMm, thicknessMm, lengthMm, material, form, role } = element as BuckleElement;
  const sizes = [widthMm, thicknessMm].filter(isNumber).map(numberWords);
  const size = sizes.length === 0 ? '' : `${sizes.join(' × ')} mm`;
  const noun =
    form === undefined
      ? role === undefined
        ? 'element'
        : labelOf('buckle.elements.role', role)
      : labelOf('buckle.elements.form', form);
  const stuff =
    material === undefined || (material === 'silicone-sponge' && noun.endsWith('sponge'))
      ? material === undefined
        ? ''
        : 'silicone'
      : labelOf('buckle.elements.material', material);
  const long = role !== 'encircling' && isNumber(lengthMm) ? `, ${numberWords(lengthMm)} mm long` : '';
  return [size, stuff, noun].filter((part) => part !== '').join(' ') + long;
};

/** "polyester knot", "metal clip". */
const closingWords = (closure: unknown): string => {
  if (typeof closure !== 'object' || closure === null) return '';
  const { kind, material } = closure as Exclude<BuckleElement['closure'], string | undefined>;
  const stuff =
    material === undefined || material === 'not-applicable'
      ? ''
      : `${labelOf('buckle.elements.closure.material', material)} `;
  return kind === undefined ? '' : stuff + labelOf('buckle.elements.closure.kind', kind);
};

/** "two breaks", from a list. */
const counted = (list: unknown, one: string, many: string): string =>
  isList(list) ? `${countWords(list.length)} ${list.length === 1 ? one : many}` : '';

const courseWords = (times: unknown, weeks: unknown): string => {
  const often = isNumber(times) ? `${timesWords(times)} a day` : '';
  const long = isNumber(weeks) ? `for ${numberWords(weeks)} ${weeks === 1 ? 'week' : 'weeks'}` : '';
  return [often, long].filter((part) => part !== '').join(' ');
};

/** "about 9 to 19 days", from the published half-lives and spans. */
const gasSpan = (tamponade: unknown, lens: unknown): string => {
  if (typeof tamponade !== 'object' || tamponade === null) return '';
  const { agent, concentrationPercent, mixing } = tamponade as NonNullable<CaseRecord['tamponade']>;
  if (!isGas(agent)) return '';
  const percent =
    mixing === 'pure'
      ? 100
      : isNumber(concentrationPercent)
        ? concentrationPercent
        : gasFacts[agent].isoexpansile.usual;
  const { low, high } = spanDays(agent, percent, lens === 'aphakic' ? 'aphakic' : 'phakic');
  return high < 21
    ? `about ${Math.round(low)} to ${Math.round(high)} days`
    : `about ${Math.max(1, Math.round(low / 7))} to ${Math.round(high / 7)} weeks`;
};

/** "1.3 to 2.8 dioptres", what published encircling bands did to the refraction; nothing for a band that was not tightened. */
const bandShift = (elements: unknown): string => {
  if (!isList(elements)) return '';
  const tight = (elements as readonly BuckleElement[]).some(
    ({ role, shortenedMm }) => role === 'encircling' && (shortenedMm ?? 0) > 0,
  );
  const [most, least] = publishedBand.shiftDioptres;
  return tight ? `${numberWords(-least)} to ${numberWords(-most)} dioptres` : '';
};

/** Small decisions on values, so that templates hold words only. */
export const helpers = {
  is: (a: unknown, b: unknown) => a === b,
  isNot: (a: unknown, b: unknown) => a !== undefined && a !== b,
  known: (value: unknown) => value !== undefined,
  isNo: (value: unknown) => value === false,
  isList: (value: unknown) => isList(value),
  all: (...given: unknown[]) =>
    values(given).every((value) => value !== undefined && value !== false && value !== ''),
  any: (...given: unknown[]) =>
    values(given).some((value) => value !== undefined && value !== false && value !== ''),
  includes: (list: unknown, value: unknown) => isList(list) && [...list].includes(value),
  moreThan: (value: unknown, than: number) => isNumber(value) && value > than,
  label: (path: string, value: unknown) => (isText(value) ? labelOf(path, value) : ''),
  labels: (path: string, chosen: unknown) => listWords(labels(path, chosen)),
  either: (path: string, chosen: unknown) => listWords(labels(path, chosen), 'or'),
  lower: (value: unknown) => (isText(value) ? lowerFirst(value) : ''),
  an: (value: unknown) => (isText(value) ? withArticle(value) : ''),
  number: (value: unknown) => (isNumber(value) ? numberWords(value) : ''),
  counted,
  countOf: (value: unknown, one: string, many: string) =>
    isNumber(value) ? `${countWords(value)} ${value === 1 ? one : many}` : '',
  figureOf: (value: unknown, one: string, many: string) =>
    isNumber(value) ? `${numberWords(value)} ${value === 1 ? one : many}` : '',
  date: (value: unknown) => (isText(value) ? dateWords(value) : ''),
  time: (value: unknown) => (isText(value) ? timeWords(value) : ''),
  clock: (value: unknown) => (isNumber(value) ? clockWords(value) : ''),
  hoursBetween: (from: unknown, to: unknown) =>
    isNumber(from) && isNumber(to) ? numberWords(clockwise(from, to)) : '',
  element: elementWords,
  fixation: fixationWords,
  closing: closingWords,
  course: courseWords,
  gasSpan,
  bandShift,
  otherEye: (eye: unknown) => (eye === 'right' ? 'left' : 'right'),
  numbered: (list: unknown, one: string, many: string) =>
    isList(list) ? `${list.length === 1 ? one : many} ${listWords(list.map(String))}` : '',
} satisfies Record<string, (...given: never[]) => unknown>;

export const registerHelpers = (engine: Pick<typeof Handlebars, 'registerHelper'>): void => {
  for (const [name, helper] of Object.entries(helpers))
    engine.registerHelper(name, helper as Helper as Handlebars.HelperDelegate);
};
