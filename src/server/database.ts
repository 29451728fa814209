import { openDatabase } from '../db/client.ts';
import { atStop } from './at-stop.ts';
import { config } from './config.ts';

let opened: ReturnType<typeof openDatabase> | undefined;

const open = () => {
  if (opened === undefined) {
    opened = openDatabase(config().databaseUrl);
    const { pool } = opened;
    atStop(() => pool.end());
  }
  return opened;
};

/** The database of this process, opened at the first use: importing a page must not open it. */
export const database = () => open().db;

/** Its connections, for libraries that write their own SQL. */
export const connections = () => open().pool;
