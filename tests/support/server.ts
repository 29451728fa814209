import { type ChildProcess, spawn } from 'node:child_process';
import { mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { ensureSigningKey } from '../../scripts/lib/data-folder.mjs';
import { startMailCatcher } from '../../scripts/lib/mail-catcher.mjs';
import { freePort, projectFolder } from '../../scripts/lib/process.mjs';
import type { TestDatabase } from './database.ts';

export interface TestServer {
  /** Of the first instance, without a slash at the end. */
  url: string;
  /** One for each instance. */
  urls: string[];
  /** Takes each letter that was sent, as a file. */
  mailFolder: string;
  /** The messages that have arrived, oldest first. */
  messages: () => string[];
  /** What the instances have printed. */
  output: () => string;
  stop: () => Promise<void>;
}

interface Options {
  database: Pick<TestDatabase, 'url'>;
  /** How many processes share the database, the mail server and the key; 1 unless said. */
  instances?: number;
  /** What the mail server answers to a recipient instead of accepting it. */
  refuse?: (address: string) => { code: number; message: string } | undefined;
  /** Further variables of the environment. */
  env?: Record<string, string>;
}

const untilListening = (child: ChildProcess, output: () => string): Promise<void> =>
  new Promise((resolve, reject) => {
    child.once('message', () => resolve());
    child.once('exit', () => reject(new Error(`The server could not start:\n${output()}`)));
  });

const ended = (child: ChildProcess): Promise<void> =>
  new Promise((resolve) => {
    if (child.exitCode !== null || child.signalCode !== null) resolve();
    else child.once('exit', () => resolve());
    child.kill('SIGTERM');
  });

/** Starts the built application as `npm start` does, on free ports, with a mail catcher. */
export const startServer = async (options: Options): Promise<TestServer> => {
  const folder = mkdtempSync(join(tmpdir(), 'buckram-server-'));
  const mailFolder = join(folder, 'mail');
  ensureSigningKey(folder);
  const catcher = await startMailCatcher({
    folder: mailFolder,
    ...(options.refuse === undefined ? {} : { refuse: options.refuse }),
  });
  const children: ChildProcess[] = [];
  const urls: string[] = [];
  let printed = '';
  const output = () => printed;

  const stop = async () => {
    await Promise.all(children.map(ended));
    await catcher.stop();
    rmSync(folder, { recursive: true, force: true });
  };

  try {
    for (let instance = 0; instance < (options.instances ?? 1); instance += 1) {
      const port = await freePort();
      urls.push(`http://127.0.0.1:${port}`);
      const child = spawn(process.execPath, [join(projectFolder, 'scripts/server.mjs')], {
        cwd: projectFolder,
        env: {
          ...process.env,
          NODE_ENV: 'production',
          DATABASE_URL: options.database.url,
          SMTP_URL: catcher.url,
          MAIL_FROM: 'Demonstration unit <unit@example.org>',
          PUBLIC_ADDRESS: urls[0],
          HOST: '127.0.0.1',
          PORT: String(port),
          SIGNING_KEY_FOLDER: folder,
          DEMONSTRATION: 'true',
          ...options.env,
        },
        stdio: ['ignore', 'pipe', 'pipe', 'ipc'],
      });
      children.push(child);
      for (const stream of [child.stdout, child.stderr]) {
        stream?.setEncoding('utf8').on('data', (text: string) => {
          printed += text;
        });
      }
      await untilListening(child, output);
    }
  } catch (error) {
    await stop();
    throw error;
  }

  const [url = ''] = urls;
  return {
    url,
    urls,
    mailFolder,
    messages: () =>
      readdirSync(mailFolder)
        .filter((name) => name.endsWith('.eml'))
        .sort()
        .map((name) => readFileSync(join(mailFolder, name), 'utf8')),
    output,
    stop,
  };
};
