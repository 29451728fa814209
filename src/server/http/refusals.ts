import type { ApiError } from '../../domain/api.ts';

/** Status of each refusal; the one place where failures become HTTP. */
const statuses: Readonly<Record<string, number>> = {
  'sign-in-needed': 401,
  'wrong-password': 401,
  'not-allowed': 403,
  'not-found': 404,
  'already-signed': 409,
  'not-waiting': 409,
  blocked: 409,
  'no-recipient': 409,
  'not-confirmed': 409,
  denied: 409,
  'precondition-needed': 428,
  stale: 412,
  invalid: 422,
  'too-many-attempts': 429,
  failed: 500,
};

export const json = (body: unknown, status = 200): Response =>
  new Response(JSON.stringify(body), {
    status,
    headers: { 'content-type': 'application/json; charset=utf-8' },
  });

export const refuse = (error: ApiError): Response => json(error, statuses[error.code] ?? 400);
