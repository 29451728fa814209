import type { Eye, Quadrant } from '../../../src/domain/record/schema.ts';
import { clockwise, quadrantsClockwise, sharedHours, within, wrap } from './globe.ts';
import type { Random } from './random.ts';
import type { Scenario } from './scenario.ts';

/** How far the retina is off. Without hours when it is total, or when nothing is detached. */
export interface Detachment {
  total: boolean;
  from?: number;
  to?: number;
  quadrants: number;
}

export const isDetachedAt = (detachment: Detachment, clock: number): boolean =>
  detachment.total ||
  (detachment.from !== undefined &&
    detachment.to !== undefined &&
    within(clock, detachment.from, detachment.to));

/** Hours of a quadrant that are detached. */
export const detachedHours = (detachment: Detachment, quadrant: Quadrant, eye: Eye): number => {
  if (detachment.total) return 3;
  if (detachment.from === undefined || detachment.to === undefined) return 0;
  return sharedHours(detachment.from, detachment.to, eye)[quadrant];
};

export const clockIn = (random: Random, quadrant: Quadrant, eye: Eye): number =>
  wrap(quadrantsClockwise(eye).indexOf(quadrant) * 3 + random.stepped(0.25, 2.75, 0.25));

/** Where the leading break lies. */
export const primaryClock = (random: Random, scenario: Scenario, eye: Eye): number => {
  if (scenario.name === 'pneumatic retinopexy') {
    return wrap(
      random.weighted([
        [5, random.stepped(11, 13, 0.25)],
        [2, random.stepped(8.5, 9.5, 0.25)],
        [2, random.stepped(2.5, 3.5, 0.25)],
        [1, random.pick([10.5, 13.5])],
      ]),
    );
  }
  const dialysis = scenario.disease === 'dialysis' || scenario.disease === 'round-holes';
  const quadrant = random.weighted<Quadrant>([
    [dialysis ? 3 : 60, 'superotemporal'],
    [dialysis ? 2 : 16, 'superonasal'],
    [dialysis ? 9 : 15, 'inferotemporal'],
    [dialysis ? 2 : 9, 'inferonasal'],
  ]);
  return clockIn(random, quadrant, eye);
};

/** The extent of a detachment that a break at this place gives rise to, after Lincoff. */
const extentFrom = (random: Random, clock: number, small: boolean): { from: number; to: number } => {
  const near = random.stepped(0.25, 1.25, 0.25);
  const far = small ? random.stepped(1.25, 2.5, 0.25) : random.stepped(2, 6, 0.25);
  const fromTop = clock % 12;
  if (fromTop <= 0.5 || fromTop >= 11.5) {
    return {
      from: wrap(clock - random.stepped(1.25, small ? 1.75 : 3.5, 0.25)),
      to: wrap(clock + random.stepped(1.25, small ? 1.75 : 3.5, 0.25)),
    };
  }
  // Below the horizontal, fluid stands higher on the side of the break.
  const below = fromTop > 3.75 && fromTop < 8.25;
  const toBottom = Math.abs(fromTop - 6);
  const underHorizontal = 3 - toBottom;
  const rise = below ? Math.max(near, Math.min(near + 1, underHorizontal)) : near;
  const higher = Math.min(rise, fromTop < 6 ? fromTop : 12 - fromTop);
  const lower = below ? Math.min(far, toBottom * 2 + higher - 0.5) : far;
  const reach = Math.max(lower, 0.75);
  return fromTop <= 6
    ? { from: wrap(clock - higher), to: wrap(clock + reach) }
    : { from: wrap(clock - reach), to: wrap(clock + higher) };
};

const clearQuadrants = (from: number, to: number, eye: Eye): number | undefined => {
  const shares = Object.values(sharedHours(from, to, eye));
  if (shares.some((hours) => hours > 0 && hours < 0.7)) return undefined;
  return shares.filter((hours) => hours > 0).length;
};

/** A detachment that fits the operation and the leading break. */
export const planDetachment = (random: Random, scenario: Scenario, clock: number, eye: Eye): Detachment => {
  const none = { total: false, quadrants: 0 };
  if (scenario.disease === 'break-only') return none;
  const totalShare = { pvr: 0.5, 'giant-tear': 0.25, 'macular-hole': 0.5, tears: 0.03 };
  const share = totalShare[scenario.disease as keyof typeof totalShare] ?? 0;
  if (scenario.name !== 'pneumatic retinopexy' && random.chance(share)) return { total: true, quadrants: 4 };
  for (let attempt = 0; attempt < 400; attempt += 1) {
    const small = scenario.name === 'pneumatic retinopexy' || scenario.buckle === 'radial';
    const { from, to } =
      scenario.disease === 'macular-hole' || scenario.disease === 'diabetic'
        ? { from: random.stepped(2, 4, 0.5), to: random.stepped(8, 10, 0.5) }
        : extentFrom(random, clock, small);
    const span = clockwise(from, to);
    if (scenario.disease === 'giant-tear' && span < 5.5) continue;
    if (scenario.disease === 'pvr' && span < 4) continue;
    const quadrants = span > 10.5 ? undefined : clearQuadrants(from, to, eye);
    if (quadrants !== undefined && quadrants > 0) return { total: false, from, to, quadrants };
  }
  return { total: true, quadrants: 4 };
};
