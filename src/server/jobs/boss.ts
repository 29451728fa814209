import PgBoss from 'pg-boss';
import { atStop } from '../at-stop.ts';
import { config } from '../config.ts';
import { database } from '../database.ts';
import { log } from '../http/log.ts';
import { forgottenLetters, sendLetter } from '../letters/send.ts';

const SEND_LETTER = 'send-letter';
const RETRIES = 6;
const SWEEP_MS = 60_000;

interface SendLetter {
  letterId: string;
}

let running: Promise<PgBoss> | undefined;

const options = (letterId: string) => ({
  // One job a letter that waits: queueing it twice changes nothing.
  singletonKey: letterId,
  retryLimit: RETRIES,
  retryDelay: 5,
  retryBackoff: true,
  expireInMinutes: 5,
});

const start = async (): Promise<PgBoss> => {
  const boss = new PgBoss({ connectionString: config().databaseUrl, max: 2 });
  boss.on('error', (error) => log().error({ name: error.name }, 'the job queue reported an error'));
  await boss.start();
  atStop(() => boss.stop({ graceful: true, timeout: 4000 }));
  await boss.createQueue(SEND_LETTER, { name: SEND_LETTER, policy: 'short' });
  await boss.work<SendLetter>(
    SEND_LETTER,
    { batchSize: 1, pollingIntervalSeconds: 1, includeMetadata: true },
    async ([job]) => {
      if (job === undefined) return;
      const outcome = await sendLetter(database(), job.data.letterId, job.retryCount >= RETRIES);
      if (outcome === 'try-again') throw new Error('The letter could not be handed over yet.');
    },
  );
  await takeUpForgotten(boss);
  const sweep = setInterval(() => void takeUpForgotten(boss).catch(() => undefined), SWEEP_MS);
  sweep.unref();
  atStop(async () => clearInterval(sweep));
  return boss;
};

/** Asks again for letters that are queued but have no job: the process that should have asked died, or every try was cut short. */
const takeUpForgotten = async (boss: PgBoss): Promise<void> => {
  for (const letterId of await forgottenLetters(database(), SEND_LETTER)) {
    await boss.send(SEND_LETTER, { letterId } satisfies SendLetter, options(letterId));
  }
};

/** The job queue of this process, started at the first use; every process works on the same jobs. */
export const jobs = (): Promise<PgBoss> => {
  running ??= start().catch((error: unknown) => {
    running = undefined;
    throw error;
  });
  return running;
};

/**
 * Asks for a queued letter to be sent. Call after the commit that queued it: the letter goes whatever happens here, because what is
 * queued without a job is taken up again.
 */
export const requestSending = async (letterId: string): Promise<void> => {
  try {
    await (await jobs()).send(SEND_LETTER, { letterId } satisfies SendLetter, options(letterId));
  } catch (error) {
    log().error(
      { name: error instanceof Error ? error.name : 'unknown' },
      'a letter waits for the job queue',
    );
  }
};
