import { createServer } from 'node:http';
import pg from 'pg';
import { createStarted } from '../lib/process.mjs';
import { startTestDatabase } from '../lib/test-database.mjs';
import { table } from './measure.ts';

const AT_ONCE = 8;
const SECONDS = 3;

/** Answers a second, asked by eight at once for three seconds after a short warm-up. */
const perSecond = async (ask: () => Promise<unknown>): Promise<number> => {
  const askUntil = async (end: number) => {
    let answers = 0;
    while (performance.now() < end) {
      await ask();
      answers += 1;
    }
    return answers;
  };
  const together = async (ms: number) => {
    const end = performance.now() + ms;
    const all = await Promise.all(Array.from({ length: AT_ONCE }, () => askUntil(end)));
    return all.reduce((sum, answers) => sum + answers, 0);
  };
  await together(700);
  return (await together(SECONDS * 1000)) / SECONDS;
};

const started = createStarted();
try {
  Object.assign(process.env, await startTestDatabase(started));
  const { createTestDatabase } = await import('../../tests/support/database.ts');
  const { startServer } = await import('../../tests/support/server.ts');
  const { signInAs } = await import('../../tests/support/person.ts');
  const database = await createTestDatabase({ demonstration: true });
  const server = await startServer({ database, env: { LOG_LEVEL: 'silent' } });
  const pool = new pg.Pool({ connectionString: database.url, max: 10 });
  const { rows } = await pool.query('select id, record from cases order by position');
  const { id, record } = rows[0];

  // The bare server does the same query and nothing else: no session, no policy, no log.
  const list = 'select id, position, state, record from cases order by position';
  const bare = createServer(async (request, answer) => {
    const found =
      request.url === '/list'
        ? await pool.query(list)
        : await pool.query('select * from cases where id = $1', [id]);
    answer.setHeader('content-type', 'application/json').end(JSON.stringify(found.rows));
  });
  await new Promise<void>((resolve) => bare.listen(0, '127.0.0.1', resolve));
  const address = bare.address();
  const bareUrl = typeof address === 'object' && address !== null ? `http://127.0.0.1:${address.port}` : '';

  const surgeon = await signInAs(server.url, 'surgeon');
  const drain = async (answer: Promise<Response>) => (await answer).arrayBuffer();
  const load = await perSecond(() => drain(surgeon.get(`/api/cases/${id}`)));
  const bareLoad = await perSecond(() => drain(fetch(`${bareUrl}/case`)));
  const page = await perSecond(() => drain(surgeon.get('/')));
  const bareList = await perSecond(() => drain(fetch(`${bareUrl}/list`)));
  let revision = 1;
  const sheet = { title: 'Operative note', sections: [] };
  const begun = performance.now();
  const saves = 200;
  for (let save = 0; save < saves; save += 1) {
    await drain(surgeon.send('PUT', `/api/cases/${id}`, { record, sheet, answers: [] }, revision));
    revision += 1;
  }
  const saving = (saves / (performance.now() - begun)) * 1000;

  const n = (value: number) => value.toFixed(0);
  table(`Over HTTP, ${AT_ONCE} at once, against a bare server doing the same query`, [
    ['load a case', `${n(load)} a second`, `bare ${n(bareLoad)}, ${(bareLoad / load).toFixed(1)}×`],
    [
      'theatre list as a page',
      `${n(page)} a second`,
      `bare JSON ${n(bareList)}, ${(bareList / page).toFixed(1)}×`,
    ],
    [
      'save a case, one after another',
      `${n(saving)} a second`,
      'checked, kept as a revision, logged in the chain',
    ],
  ]);
  await pool.end();
  await new Promise((resolve) => bare.close(resolve));
  bare.closeAllConnections();
  await server.stop();
} finally {
  await started.stop();
}
