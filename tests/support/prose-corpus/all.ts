import { agent } from './agent.ts';
import { clockHour } from './clock-hour.ts';
import { concentration } from './concentration.ts';
import { count } from './count.ts';
import { date } from './date.ts';
import { duration } from './duration.ts';
import { length } from './length.ts';
import { lens } from './lens.ts';
import { macula } from './macula.ts';
import { material } from './material.ts';
import { medicine } from './medicine.ts';
import { negation } from './negation.ts';
import { posture } from './posture.ts';
import { quadrant } from './quadrant.ts';
import type { Sample } from './sample.ts';
import { side } from './side.ts';

/** Sentences written without sight of the reader's word lists, each with the words that its record denies. */
export const corpus: readonly Sample[] = [
  ...side,
  ...agent,
  ...concentration,
  ...clockHour,
  ...quadrant,
  ...length,
  ...count,
  ...material,
  ...lens,
  ...macula,
  ...posture,
  ...duration,
  ...date,
  ...medicine,
  ...negation,
];
