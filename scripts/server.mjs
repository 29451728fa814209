import { createServer, get } from 'node:http';
import { checkConfiguration } from './lib/configuration.mjs';
import { Answer } from './lib/http/answer.mjs';
import { bodyLimit, readBody } from './lib/http/body.mjs';
import { addressesOf, dropForwarded, refusalOf } from './lib/http/gate.mjs';
import { quietErrors, saySafely } from './lib/http/safe-log.mjs';
import { Stop } from './lib/process.mjs';

/** How long requests in progress may take once the server is told to stop, in milliseconds. */
const patience = 5000;

const config = await checkConfiguration(process.env).catch((error) => {
  console.error(error instanceof Stop ? error.message : error);
  return process.exit(1);
});

process.env.ASTRO_NODE_AUTOSTART = 'disabled';
process.env.NODE_ENV ??= 'production';
quietErrors();
const entry = new URL('../dist/server/entry.mjs', import.meta.url).href;
/** @type {{ handler: (request: import('node:http').IncomingMessage, answer: import('node:http').ServerResponse) => unknown }} */
const { handler } = await import(entry).catch((error) => {
  if (error.code === 'ERR_MODULE_NOT_FOUND' && error.url === entry) {
    console.error('The application is not built; npm start builds it, or npm run build.');
    return process.exit(1);
  }
  throw error;
});
quietErrors();

const addresses = addressesOf(config.publicAddress, config.port);
let stopping = false;

/**
 * @param {import('node:http').IncomingMessage} request
 * @param {Answer} answer
 */
const serve = async (request, answer) => {
  answer.isSecure = config.publicAddress.startsWith('https:');
  if (request.url === '/healthz') {
    answer.setHeader('Content-Type', 'text/plain; charset=utf-8');
    answer.statusCode = stopping ? 503 : 200;
    answer.end(stopping ? 'stopping\n' : 'ok\n');
    return;
  }
  if (stopping) answer.setHeader('Connection', 'close');
  dropForwarded(request.headers, config.trustedProxies);
  const refusal = refusalOf(request, addresses);
  if (refusal !== undefined) {
    refuse(request, answer, refusal.status, refusal.message);
    return;
  }
  if (request.method !== 'GET' && request.method !== 'HEAD') {
    const body = await readBody(request);
    if (body === undefined) {
      refuse(
        request,
        answer,
        413,
        `At most ${bodyLimit / 1024 / 1024} MiB can be sent at once; split it up.`,
      );
      return;
    }
    // The framework takes a body that was read already under this name, if it is iterable and has no keys of its own.
    Object.assign(request, {
      body: {
        async *[Symbol.asyncIterator]() {
          if (body.length > 0) yield body;
        },
      },
    });
  }
  await handler(request, answer);
};

/**
 * Answers without reading the rest of what is being sent, and lets go of the connection.
 * @param {import('node:http').IncomingMessage} request
 * @param {Answer} answer
 * @param {number} status
 * @param {string} [message]
 */
const refuse = (request, answer, status, message) => {
  if (!request.complete) {
    answer.setHeader('Connection', 'close');
    // A client that is still sending would miss the answer if the connection were cut at once.
    const cut = setTimeout(() => request.socket.destroy(), 2000);
    request.once('close', () => clearTimeout(cut));
    request.resume();
  }
  answer.sendError(status, message);
};

const server = createServer({ ServerResponse: Answer, requestTimeout: 60_000 }, (request, answer) => {
  serve(request, answer).catch((error) => {
    if (request.destroyed && !request.complete) return;
    saySafely(error);
    answer.sendError(500);
  });
});

server.on('clientError', (_error, socket) => {
  if (socket.writable)
    socket.end('HTTP/1.1 400 Bad Request\r\nConnection: close\r\nContent-Length: 0\r\n\r\n');
});

/** Ends what the application does beside answering (src/server/at-stop.ts). */
const endBackgroundWork = async () => {
  /** @type {Set<() => Promise<void>>} */
  const ends = Reflect.get(globalThis, Symbol.for('buckram.at-stop')) ?? new Set();
  const results = await Promise.allSettled([...ends].map((end) => end()));
  for (const result of results) if (result.status === 'rejected') saySafely(result.reason);
};

const stop = () => {
  if (stopping) return;
  stopping = true;
  setTimeout(() => process.exit(0), patience);
  const closed = new Promise((resolve) => server.close(resolve));
  server.closeIdleConnections();
  Promise.all([closed, endBackgroundWork()]).then(() => process.exit(0));
};
process.on('SIGTERM', stop);
process.on('SIGINT', stop);
// With a channel to the process that started this one, its end is a reason to stop as well.
if (process.channel) process.once('disconnect', stop);

server.once('error', (error) => {
  const taken = 'code' in error && error.code === 'EADDRINUSE';
  console.error(taken ? `Port ${config.port} on ${config.host} is in use.` : error.message);
  process.exit(1);
});
server.listen(config.port, config.host, () => {
  // The first request starts the work in the background: letters that were queued before a stop go out without anybody coming.
  const { host, port } = config;
  get({ host, port, path: '/sign-in', headers: { host: `127.0.0.1:${port}` } }, (answer) =>
    answer.resume(),
  ).on('error', () => undefined);
  if (process.send) process.send('listening');
  else console.log(`Listening on http://${config.host}:${config.port}`);
});
