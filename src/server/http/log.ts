import pino from 'pino';
import { config } from '../config.ts';

let made: pino.Logger | undefined;

/** Structured lines on standard output. They hold ids, routes and durations, never patient data or query parameters. */
export const log = (): pino.Logger => {
  made ??= pino({ level: config().logLevel, base: null });
  return made;
};
