import type { z } from 'zod';
import { ok, type Result } from '../../domain/result.ts';

/** What is wrong with a form: a sentence for each field, and what was typed, so that nothing is lost. */
export interface FormErrors {
  errors: Readonly<Record<string, string>>;
  typed: Readonly<Record<string, string>>;
}

/** What was typed; of a field that was sent several times, all of it with spaces between. Passwords are not given back. */
export const typedIn = (sent: FormData): Record<string, string> =>
  Object.fromEntries(
    [...new Set(sent.keys())]
      .filter((name) => name !== 'password')
      .map((name) => [
        name,
        sent
          .getAll(name)
          .filter((value) => typeof value === 'string')
          .join(' '),
      ]),
  );

/** Reads a form by a schema; fields that may be sent several times are given by name. */
export const readForm = <T>(
  schema: z.ZodType<T>,
  sent: FormData,
  lists: readonly string[] = [],
): Result<T, FormErrors> => {
  const texts = Object.fromEntries(
    [...sent].flatMap(([name, value]) => (typeof value === 'string' ? [[name, value]] : [])),
  );
  const many = Object.fromEntries(lists.map((name) => [name, sent.getAll(name).map(String)]));
  const parsed = schema.safeParse({ ...texts, ...many });
  if (parsed.success) return ok(parsed.data);
  const errors: Record<string, string> = {};
  for (const { path, message } of parsed.error.issues) errors[String(path[0])] ??= message;
  return { ok: false, error: { errors, typed: typedIn(sent) } };
};

const UUID = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/;

/** Whether a form can mean a row at all. */
export const isId = (text: string): boolean => UUID.test(text);
