import { createHash } from 'node:crypto';

const style =
  'body{background:#f5f0e6;color:#22252b;font:1.1rem/1.6 Georgia,serif;max-width:34rem;margin:15vh auto;padding:0 1.5rem}h1{font-size:1.5rem}a{color:#1f4b46}';

/** @type {Record<number, [title: string, advice: string]>} */
const words = {
  400: ['This address cannot be read', 'Check how it is written.'],
  403: ['This is not yours to open', 'Sign in with the role whose desk this is.'],
  404: ['There is nothing here', 'The address may be mistyped, or what it led to may have moved.'],
  405: ['This cannot be done here', 'Go back and use the page.'],
  413: ['This is too large', 'At most 2 MiB can be sent at once; split it up.'],
  500: [
    'Something went wrong on the server',
    'What was acknowledged as saved is safe. Go back, reload the page and try again; if it happens again, tell your administrator when.',
  ],
  503: ['The server is stopping', 'Wait a minute, then reload the page.'],
};

/** @param {string} text */
const escaped = (text) => text.replaceAll('&', '&amp;').replaceAll('<', '&lt;');

/**
 * The answer where the application gave none.
 * @param {number} status
 * @param {boolean} asJson
 * @param {string} [message] in place of the usual words
 * @returns {{ type: string, policy: string, body: string }}
 */
export const errorAnswer = (status, asJson, message) => {
  const [title, advice] = words[status] ?? (status < 500 ? words[400] : words[500]) ?? ['', ''];
  if (asJson) {
    return {
      type: 'application/json; charset=utf-8',
      policy: "default-src 'none'",
      body: JSON.stringify({ code: `http-${status}`, message: message ?? `${title}. ${advice}` }),
    };
  }
  return {
    type: 'text/html; charset=utf-8',
    policy: `default-src 'none'; style-src 'sha256-${createHash('sha256').update(style).digest('base64')}'`,
    body: `<!doctype html><html lang="en-GB"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width"><title>${title} - Buckram</title><style>${style}</style></head><body><main><h1>${title}</h1><p>${escaped(message ?? advice)}</p><p><a href="/">To the first page</a></p></main></body></html>`,
  };
};
