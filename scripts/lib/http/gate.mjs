/** @typedef {{ status: 400 | 403 | 405, message?: string }} Refusal without a message, the usual words will do */

/**
 * What this server answers to.
 * @typedef {object} Addresses
 * @property {ReadonlySet<string>} hosts as in a Host header: "notes.example.org", "127.0.0.1:4321"
 * @property {ReadonlySet<string>} origins as in an Origin header
 */

/**
 * The public address, and this machine's own names with the port that is listened on.
 * @param {string} publicAddress
 * @param {number} port
 * @returns {Addresses}
 */
export const addressesOf = (publicAddress, port) => {
  const urls = [publicAddress, `http://127.0.0.1:${port}`, `http://localhost:${port}`].map(
    (address) => new URL(address),
  );
  return {
    hosts: new Set(urls.map((url) => url.host)),
    origins: new Set(urls.map((url) => url.origin)),
  };
};

const methods = new Set(['GET', 'HEAD', 'POST', 'PUT', 'PATCH', 'DELETE']);

/** @param {string} host as sent; browsers leave the scheme's own port out, other clients may not */
const withoutUsualPort = (host) => host.toLowerCase().replace(/:(?:80|443)$/, '');

/**
 * Whether a change comes from a page of ours. Browsers send Origin with every request that is neither GET nor HEAD, JSON included; it must
 * be the very host that is asked. Without Origin, only a browser's own word that the page is of the same origin will do: a program that
 * is no browser sends the Origin of the address it calls.
 * @param {import('node:http').IncomingHttpHeaders} headers
 * @param {string} host
 * @param {Addresses} addresses
 */
const comesFromOurPage = (headers, host, addresses) => {
  const { origin } = headers;
  if (origin === undefined) return headers['sec-fetch-site'] === 'same-origin';
  return addresses.origins.has(origin) && new URL(origin).host === host;
};

/**
 * Decides from the first lines of a request whether it goes on to the application.
 * @param {Pick<import('node:http').IncomingMessage, 'method' | 'url' | 'headers'>} request
 * @param {Addresses} addresses
 * @returns {Refusal | undefined}
 */
export const refusalOf = ({ method = '', url = '', headers }, addresses) => {
  if (!methods.has(method)) return { status: 405 };
  // A full or a double-slashed target would be read as another host further in.
  if (!url.startsWith('/') || url.startsWith('//') || url.includes('\\')) {
    return { status: 400 };
  }
  const host = withoutUsualPort(headers.host ?? '');
  if (!addresses.hosts.has(host)) {
    return {
      status: 400,
      message: 'This server is not known by that name. Use the address that you were given.',
    };
  }
  if (method !== 'GET' && method !== 'HEAD' && !comesFromOurPage(headers, host, addresses)) {
    return {
      status: 403,
      message: 'This request came from another site and was refused. Open the page again and retry.',
    };
  }
  return undefined;
};

const forwarded =
  /^(?:x-forwarded-|x-real-ip$|x-client-ip$|x-original-|x-rewrite-|forwarded$|cf-connecting-ip$|true-client-ip$)/;

/**
 * Drops everything that a client could claim about itself or its route. With proxies of our own in front, the address that the outermost
 * of them has seen is kept as the only one.
 * @param {import('node:http').IncomingHttpHeaders} headers changed in place
 * @param {number} trustedProxies
 */
export const dropForwarded = (headers, trustedProxies) => {
  const chain = String(headers['x-forwarded-for'] ?? '').split(',');
  const client = trustedProxies > 0 ? chain.at(-trustedProxies)?.trim() : undefined;
  for (const name of Object.keys(headers)) if (forwarded.test(name)) delete headers[name];
  if (client) headers['x-forwarded-for'] = client;
};
