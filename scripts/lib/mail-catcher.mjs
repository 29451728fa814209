import { randomBytes } from 'node:crypto';
import { mkdirSync, renameSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { SMTPServer } from 'smtp-server';

/**
 * A mail server on loopback that delivers nothing: each message is kept as a file, `TIME-RANDOM.eml`.
 * @param {object} options
 * @param {string} options.folder
 * @param {(address: string) => { code: number, message: string } | undefined} [options.refuse]
 *   for tests: what to answer to a recipient instead of accepting it
 * @returns {Promise<{ url: string, stop: () => Promise<void> }>}
 */
export const startMailCatcher = async ({ folder, refuse = () => undefined }) => {
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS', 'AUTH'],
    size: 25 * 1024 * 1024,
    logger: false,
    onRcptTo: (address, _session, callback) => {
      const refused = refuse(address.address);
      callback(refused && Object.assign(new Error(refused.message), { responseCode: refused.code }));
    },
    onData: (stream, _session, callback) => {
      /** @type {Buffer[]} */
      const parts = [];
      stream.on('data', (/** @type {Buffer} */ part) => parts.push(part));
      stream.once('end', () => {
        const name = `${new Date().toISOString().replaceAll(':', '-')}-${randomBytes(4).toString('hex')}.eml`;
        // Written under another name first, so that nobody reads half a message.
        const unfinished = join(folder, `${name}.part`);
        writeFileSync(unfinished, Buffer.concat(parts), { mode: 0o600 });
        renameSync(unfinished, join(folder, name));
        callback();
      });
    },
  });
  server.on('error', () => undefined);
  await new Promise((resolve, reject) => {
    server.server.once('error', reject);
    server.listen(0, '127.0.0.1', () => resolve(undefined));
  });
  const address = server.server.address();
  const port = typeof address === 'object' && address !== null ? address.port : 0;
  return {
    url: `smtp://127.0.0.1:${port}`,
    stop: () => new Promise((resolve) => server.close(() => resolve())),
  };
};
