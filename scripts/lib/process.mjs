import { spawn } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { fileURLToPath } from 'node:url';

/** The project's folder, without a slash at the end. */
export const projectFolder = fileURLToPath(new URL('../..', import.meta.url)).replace(/\/$/, '');

/** @param {string} line */
export const say = (line) => process.stdout.write(`${line}\n`);

/** An expected end: one clear line for people, no stack. */
export class Stop extends Error {}

/**
 * @typedef {object} RunOptions
 * @property {string} [cwd]
 * @property {NodeJS.ProcessEnv} [env] the whole environment of the child
 * @property {number} [uid]
 * @property {number} [gid]
 * @property {boolean} [quiet] collects what it prints instead of showing it
 */

/** @type {Set<import('node:child_process').ChildProcess>} */
const running = new Set();

/** Ends every command that `run` has started and that still runs. */
export const endCommands = () => {
  for (const child of running) child.kill('SIGTERM');
};

/**
 * Runs a command to its end, without a shell.
 * @param {string} command
 * @param {string[]} args
 * @param {RunOptions} [options]
 * @returns {Promise<{ code: number, output: string }>} code 127 when it could not be started
 */
export const run = (command, args, { quiet = false, cwd = projectFolder, ...rest } = {}) =>
  new Promise((resolve) => {
    const child = spawn(command, args, {
      cwd,
      ...rest,
      stdio: ['ignore', quiet ? 'pipe' : 'inherit', quiet ? 'pipe' : 'inherit'],
    });
    running.add(child);
    let output = '';
    for (const stream of [child.stdout, child.stderr]) {
      stream?.setEncoding('utf8').on('data', (/** @type {string} */ text) => {
        output += text;
      });
    }
    /** @param {number} code @param {string} text */
    const done = (code, text) => {
      running.delete(child);
      resolve({ code, output: text });
    };
    child.once('error', (error) => done(127, error.message));
    child.once('close', (code) => done(code ?? 1, output));
  });

/**
 * Runs a script of the project with TypeScript understood.
 * @param {string} script path from the project's folder
 * @param {string[]} args
 * @param {RunOptions} [options]
 */
export const runTypeScript = (script, args = [], options = {}) =>
  run(process.execPath, ['--import', 'tsx', script, ...args], options);

/**
 * @param {string} host
 * @param {number} port
 * @returns {Promise<boolean>}
 */
export const portIsFree = (host, port) =>
  new Promise((resolve) => {
    const server = createServer();
    server.once('error', () => resolve(false));
    server.listen({ host, port, exclusive: true }, () => server.close(() => resolve(true)));
  });

/** @returns {Promise<number>} a port on loopback that nobody listens on at this moment */
export const freePort = () =>
  new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', reject);
    server.listen({ host: '127.0.0.1', port: 0 }, () => {
      const address = server.address();
      const port = typeof address === 'object' && address !== null ? address.port : 0;
      server.close(() => resolve(port));
    });
  });

/** @param {number} pid */
const parentOf = (pid) => {
  try {
    // "PID (NAME) STATE PARENT ...", and a name can hold anything.
    return readFileSync(`/proc/${pid}/stat`, 'utf8').split(') ').at(-1)?.split(' ')[1];
  } catch {
    return undefined;
  }
};

/**
 * Keeps what was started and stops it in reverse order, once: on Ctrl-C, on SIGTERM, when the terminal or the npm
 * above goes away, and at the end.
 */
export const createStarted = () => {
  /** @type {(() => Promise<void> | void)[]} */
  const stops = [];
  /** @type {Promise<void> | undefined} */
  let stopping;

  const stop = () => {
    stopping ??= (async () => {
      endCommands();
      for (const one of stops.reverse()) await one();
    })();
    return stopping;
  };

  /** @param {number} code */
  const stopAndExit = (code) => {
    if (stopping === undefined) say('\nStopping...');
    stop().then(
      () => process.exit(code),
      () => process.exit(1),
    );
  };

  process.on('SIGINT', () => stopAndExit(130));
  process.on('SIGTERM', () => stopAndExit(143));
  process.on('SIGHUP', () => stopAndExit(129));

  if (process.env.npm_lifecycle_event !== undefined) {
    // npm puts a shell in between, which outlives it.
    const line = () => `${process.ppid} ${parentOf(process.ppid)}`;
    const atStart = line();
    setInterval(() => {
      if (line() !== atStart) stopAndExit(143);
    }, 1000).unref();
  }

  return {
    /** @param {() => Promise<void> | void} one */
    add: (one) => {
      stops.push(one);
    },
    stop,
    get isStopping() {
      return stopping !== undefined;
    },
  };
};

/** @typedef {ReturnType<typeof createStarted>} Started */

/**
 * Runs the main part of a script; an expected end is one line, anything else shows its stack, and both stop what was started.
 * @param {Started} started
 * @param {() => Promise<number | undefined>} main gives the exit code when the script is over, nothing when it goes on
 */
export const runMain = (started, main) => {
  main().then(
    async (code) => {
      if (code === undefined || started.isStopping) return;
      await started.stop();
      process.exit(code);
    },
    async (error) => {
      if (started.isStopping) return;
      console.error(error instanceof Stop ? `\n${error.message}` : error);
      await started.stop();
      process.exit(1);
    },
  );
};
