import { z } from 'zod';
import { type CaseRecord, caseRecord } from './schema.ts';

interface Common {
  /** Key within its group. */
  name: string;
  title: string;
  help?: string;
  /** Words that may stand in place of a value ("none", "not-applicable", "all-breaks"), with their labels. */
  words: Readonly<Record<string, string>>;
}

export type FieldSpec = Common &
  (
    | { kind: 'group'; fields: FieldSpec[] }
    | { kind: 'list'; item: string; fields: FieldSpec[] }
    | { kind: 'choice' | 'choices'; options: Readonly<Record<string, string>> }
    | { kind: 'number'; unit: string; min: number; max: number; whole: boolean }
    | { kind: 'numbers' | 'yes-no' | 'text' | 'long-text' | 'date' | 'date-time' }
    | { kind: 'words' }
  );

const wordLabels: Readonly<Record<string, string>> = { none: 'none', 'not-applicable': 'not applicable' };

const shapeOf = (schema: z.ZodObject): FieldSpec[] =>
  Object.entries(schema.shape).map(([name, field]) => specOf(name, field as z.ZodType));

const arraySpec = (common: Common, schema: z.ZodArray, meta: z.core.GlobalMeta): FieldSpec => {
  const inner = schema.element;
  if (inner instanceof z.ZodObject) {
    return { ...common, kind: 'list', item: meta.item ?? common.title.toLowerCase(), fields: shapeOf(inner) };
  }
  if (inner instanceof z.ZodEnum) {
    return { ...common, kind: 'choices', options: meta.options ?? {} };
  }
  return { ...common, kind: 'numbers' };
};

const specOf = (name: string, schema: z.ZodType, outer: z.core.GlobalMeta = {}): FieldSpec => {
  const meta = { ...schema.meta(), ...outer };
  const common: Common = {
    name,
    title: meta.title ?? name,
    words: {},
    ...(meta.help === undefined ? {} : { help: meta.help }),
  };
  if (schema instanceof z.ZodOptional) return specOf(name, schema.unwrap() as z.ZodType, outer);
  if (schema instanceof z.ZodUnion) {
    const branches = schema.options as readonly z.ZodType[];
    const literals = branches
      .filter((branch) => branch instanceof z.ZodLiteral)
      .map((branch) => String(branch.value));
    const words = Object.fromEntries(
      literals.map((word) => [word, meta.options?.[word] ?? wordLabels[word] ?? word]),
    );
    const inner = branches.find((branch) => !(branch instanceof z.ZodLiteral));
    const spec: FieldSpec = inner === undefined ? { ...common, kind: 'words' } : specOf(name, inner, meta);
    return { ...spec, words: { ...spec.words, ...words } };
  }
  if (schema instanceof z.ZodObject) return { ...common, kind: 'group', fields: shapeOf(schema) };
  if (schema instanceof z.ZodArray) return arraySpec(common, schema, meta);
  if (schema instanceof z.ZodEnum) return { ...common, kind: 'choice', options: meta.options ?? {} };
  if (schema instanceof z.ZodBoolean) return { ...common, kind: 'yes-no' };
  if (schema instanceof z.ZodNumber) {
    return {
      ...common,
      kind: 'number',
      unit: meta.unit ?? '',
      min: schema.minValue ?? 0,
      max: schema.maxValue ?? Number.MAX_SAFE_INTEGER,
      whole: schema.isInt,
    };
  }
  return { ...common, kind: meta.entry ?? 'text' };
};

/** The record as a tree of fields, in order: what the form shows and what labels are taken from. */
export const fieldTree: readonly FieldSpec[] = shapeOf(caseRecord).filter(
  (field) => field.name !== 'version',
);

const find = (fields: readonly FieldSpec[], name: string) => fields.find((field) => field.name === name);

/** The fields on the way to a path, outermost first; indices are passed over. Empty when the path is unknown. */
export const specsOnPath = (path: string): FieldSpec[] => {
  const found: FieldSpec[] = [];
  let fields: readonly FieldSpec[] = fieldTree;
  for (const key of path.split('.')) {
    if (/^\d+$/.test(key)) continue;
    const next = find(fields, key);
    if (next === undefined) return [];
    found.push(next);
    fields = 'fields' in next ? next.fields : [];
  }
  return found;
};

/** How a field is called beside a flag: "Break 2, clock hour"; "Pressure at the end". */
export const fieldLabel = (path: string): string => {
  const specs = specsOnPath(path);
  const last = specs.at(-1);
  if (last === undefined) return path;
  const keys = path.split('.');
  const lastIndex = keys.findLastIndex((key) => /^\d+$/.test(key));
  if (lastIndex === -1) return last.title;
  const list = specsOnPath(keys.slice(0, lastIndex).join('.')).at(-1);
  const item = list?.kind === 'list' ? list.item : (list?.title ?? '');
  const numbered = `${item.charAt(0).toUpperCase()}${item.slice(1)} ${Number(keys[lastIndex]) + 1}`;
  return list === last
    ? numbered
    : `${numbered}, ${last.title.charAt(0).toLowerCase()}${last.title.slice(1)}`;
};

/** Title of one stage of the record. */
export const stageTitle = (stage: Exclude<keyof CaseRecord, 'version'>): string =>
  find(fieldTree, stage)?.title ?? stage;
