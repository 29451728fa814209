/** A globe as a sphere with the limbus as a circle on it. */
export interface Globe {
  /** Radius of the outer surface, mm. */
  radiusMm: number;
  /** Polar angle of the limbus from the corneal pole, radians. */
  limbusAngle: number;
  /** Radius of the vitreous cavity, mm. */
  cavityRadiusMm: number;
}

/** Common values where the eye's own are not known; estimates built on them say so. */
export const defaults = {
  axialLengthMm: 24,
  /** Radius of the limbus circle; with 24 mm it puts the equator 12.7 mm behind the limbus. */
  limbusRadiusMm: 5.9,
  /** Sclera, choroid and retina between the outer surface and the cavity. */
  wallMm: 1.5,
} as const;

/**
 * Globe of an axial length, mm: the axial length is taken for the outer diameter.
 * C(s) = 2πR·sin(θ0 + s/R); source: the formula itself (computed).
 */
export const globeOf = (
  axialLengthMm: number = defaults.axialLengthMm,
  limbusRadiusMm: number = defaults.limbusRadiusMm,
  wallMm: number = defaults.wallMm,
): Globe => {
  const radiusMm = axialLengthMm / 2;
  return {
    radiusMm,
    limbusAngle: Math.asin(Math.min(1, limbusRadiusMm / radiusMm)),
    cavityRadiusMm: Math.max(0, radiusMm - wallMm),
  };
};

/** Polar angle from the corneal pole, radians, of a place so many mm along the wall behind the limbus. */
export const polarAngle = (globe: Globe, mmBehindLimbus: number): number =>
  globe.limbusAngle + mmBehindLimbus / globe.radiusMm;

/** The inverse of `polarAngle`. */
export const mmBehindLimbus = (globe: Globe, angle: number): number =>
  (angle - globe.limbusAngle) * globe.radiusMm;

/** Circumference of the parallel so many mm behind the limbus, mm. */
export const parallelMm = (globe: Globe, mm: number): number =>
  2 * Math.PI * globe.radiusMm * Math.max(0, Math.sin(polarAngle(globe, mm)));

/** Circumference at the equator, mm. */
export const circumferenceMm = (globe: Globe): number => 2 * Math.PI * globe.radiusMm;

/** Arc from the limbus to the equator, mm. */
export const equatorMm = (globe: Globe): number => mmBehindLimbus(globe, Math.PI / 2);

/** Arc from the limbus to the posterior pole, mm. */
export const poleMm = (globe: Globe): number => mmBehindLimbus(globe, Math.PI);
