import { demonstrationPeople } from '../../src/server/demonstration-people.ts';

/** Somebody of the demonstration unit, signed in over HTTP. */
export interface Person {
  get: (path: string) => Promise<Response>;
  post: (path: string, form: Record<string, string>) => Promise<Response>;
  send: (method: string, path: string, body: unknown, revision?: number) => Promise<Response>;
}

/** Signs in by e-mail name ("surgeon", "fellow", …) at one instance. */
export const signInAs = async (url: string, who: string): Promise<Person> => {
  const person = demonstrationPeople.find(({ email }) => email === `${who}@example.org`);
  if (person === undefined) throw new Error(`There is no ${who}`);
  const origin = { origin: url };
  const form = (fields: Record<string, string>) => ({
    method: 'POST',
    body: new URLSearchParams(fields),
    redirect: 'manual' as const,
  });
  const answer = await fetch(`${url}/sign-in`, {
    ...form({ email: person.email, password: person.password }),
    headers: origin,
  });
  const cookie = answer.headers.get('set-cookie')?.split(';')[0];
  if (answer.status !== 303 || cookie === undefined) throw new Error(`Signing in answered ${answer.status}`);
  const headers = { ...origin, cookie };
  return {
    get: (path) => fetch(url + path, { headers, redirect: 'manual' }),
    post: (path, fields) => fetch(url + path, { ...form(fields), headers }),
    send: (method, path, body, revision) =>
      fetch(url + path, {
        method,
        headers: {
          ...headers,
          'content-type': 'application/json',
          ...(revision === undefined ? {} : { 'if-match': `"${revision}"` }),
        },
        body: JSON.stringify(body),
      }),
  };
};
