/** The largest body that is taken, in bytes. */
export const bodyLimit = 2 * 1024 * 1024;

/**
 * Reads a whole body, counting what arrives and not what was announced.
 * @param {import('node:http').IncomingMessage} request
 * @param {number} [limit]
 * @returns {Promise<Buffer | undefined>} nothing when it is larger than the limit
 * @throws when the client goes away in the middle
 */
export const readBody = async (request, limit = bodyLimit) => {
  if (Number(request.headers['content-length'] ?? 0) > limit) return undefined;
  /** @type {Buffer[]} */
  const parts = [];
  let size = 0;
  return new Promise((resolve, reject) => {
    request.on('data', (/** @type {Buffer} */ part) => {
      size += part.length;
      if (size > limit) {
        request.pause().removeAllListeners('data');
        resolve(undefined);
        return;
      }
      parts.push(part);
    });
    request.once('end', () => resolve(Buffer.concat(parts)));
    request.once('close', () => reject(new Error('The client went away.')));
    request.once('error', reject);
  });
};
