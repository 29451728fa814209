import type { ApiError, CaseSaved, CaseSigned, SaveCase, SignCase } from '../../domain/api.ts';

/** A refusal of the server, or `offline` when it could not be reached. */
export class Refusal extends Error {
  readonly answer: ApiError;

  constructor(answer: ApiError) {
    super(answer.message);
    this.answer = answer;
  }
}

const offline: ApiError = {
  code: 'offline',
  message: 'The server cannot be reached. Leave this page open: it saves as soon as the server answers.',
};

const failed: ApiError = { code: 'failed', message: 'The server could not do this. It is tried again.' };

const ask = async <T>(address: string, method: string, revision: number, body: unknown): Promise<T> => {
  let response: Response;
  try {
    response = await fetch(address, {
      method,
      headers: { 'content-type': 'application/json', 'if-match': `"${revision}"` },
      body: JSON.stringify(body),
    });
  } catch {
    throw new Refusal(offline);
  }
  const answer: unknown = await response.json().catch(() => null);
  if (response.ok) return answer as T;
  const isRefusal = typeof answer === 'object' && answer !== null && 'code' in answer && 'message' in answer;
  throw new Refusal(isRefusal ? (answer as ApiError) : failed);
};

/** Saves a case upon a revision. Refused as `stale` when somebody saved another since. */
export const putCase = (id: string, revision: number, body: SaveCase): Promise<CaseSaved> =>
  ask(`/api/cases/${id}`, 'PUT', revision, body);

export const postSignature = (id: string, revision: number, body: SignCase): Promise<CaseSigned> =>
  ask(`/api/cases/${id}/sign`, 'POST', revision, body);
