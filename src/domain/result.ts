/** An expected failure: a permanent code for programs, a message for people that says what to do. */
export interface Failure<Code extends string = string> {
  code: Code;
  message: string;
}

export type Result<Value, E = Failure> = { ok: true; value: Value } | { ok: false; error: E };

export const ok = <Value>(value: Value): { ok: true; value: Value } => ({ ok: true, value });

export const fail = <Code extends string>(
  code: Code,
  message: string,
): { ok: false; error: Failure<Code> } => ({
  ok: false,
  error: { code, message },
});
