import type { z } from 'zod';
import { ok, type Result } from '../../domain/result.ts';

/** What is wrong with a form: a sentence for each field, and what was typed, so that nothing is lost. */
export interface FormErrors {
  errors: Readonly<Record<string, string>>;
  typed: Readonly<Record<string, string>>;
}

export const typedIn = (sent: FormData): Record<string, string> =>
  Object.fromEntries(
    [...sent].flatMap(([name, value]) => (typeof value === 'string' ? [[name, value]] : [])),
  );

/** Reads a form by a schema; fields that may be sent several times are given by name. */
export const readForm = <T>(
  schema: z.ZodType<T>,
  sent: FormData,
  lists: readonly string[] = [],
): Result<T, FormErrors> => {
  const typed = typedIn(sent);
  const many = Object.fromEntries(lists.map((name) => [name, sent.getAll(name).map(String)]));
  const parsed = schema.safeParse({ ...typed, ...many });
  if (parsed.success) return ok(parsed.data);
  const errors: Record<string, string> = {};
  for (const { path, message } of parsed.error.issues) errors[String(path[0])] ??= message;
  return { ok: false, error: { errors, typed } };
};
