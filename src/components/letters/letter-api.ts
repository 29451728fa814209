import type { LetterView, SaveLetter, SendLetter } from '../../domain/letters/api.ts';
import { fail, ok, type Result } from '../../domain/result.ts';

const ask = async <Value>(address: string, init: RequestInit): Promise<Result<Value>> => {
  try {
    const response = await fetch(address, init);
    const body = await response.json();
    return response.ok ? ok(body) : fail(String(body.code), String(body.message));
  } catch {
    return fail('offline', 'The server cannot be reached. Your words stay on this page, which keeps trying.');
  }
};

const upon = (method: string, revision: number, body: unknown): RequestInit => ({
  method,
  headers: { 'content-type': 'application/json', 'if-match': `"${revision}"` },
  body: JSON.stringify(body),
});

export const readLetter = (id: string): Promise<Result<LetterView>> => ask(`/api/letters/${id}`, {});

export const keepLetter = (
  id: string,
  revision: number,
  letter: SaveLetter,
): Promise<Result<{ revision: number }>> => ask(`/api/letters/${id}`, upon('PUT', revision, letter));

export const sendLetter = (id: string, revision: number, by: SendLetter['by']): Promise<Result<null>> =>
  ask(`/api/letters/${id}/send`, upon('POST', revision, { by }));
