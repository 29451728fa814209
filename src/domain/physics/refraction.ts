/** Figures of an eye for the thin-lens computation; dioptres and millimetres. */
export interface Optics {
  axialLengthMm: number;
  keratometryDioptres: number;
  lensPositionMm: number;
  index: number;
  vertexMm: number;
}

/** As in the worked values: K 43.5 D, lens at 5 mm, n 1.336, vertex 12 mm. */
export const opticsDefaults: Optics = {
  axialLengthMm: 24,
  keratometryDioptres: 43.5,
  lensPositionMm: 5,
  index: 1.336,
  vertexMm: 12,
};

/** Power, D, of the thin lens that makes this eye emmetropic. */
const emmetropicLens = ({ axialLengthMm, keratometryDioptres, lensPositionMm, index }: Optics): number => {
  const atLens = index / (index / keratometryDioptres - lensPositionMm / 1000);
  return index / ((axialLengthMm - lensPositionMm) / 1000) - atLens;
};

/** Spectacle correction, D, of an eye with this lens. */
const correction = (optics: Optics, lens: number): number => {
  const { axialLengthMm, keratometryDioptres, lensPositionMm, index, vertexMm } = optics;
  const needed = index / ((axialLengthMm - lensPositionMm) / 1000) - lens;
  const atCornea = index / (index / needed + lensPositionMm / 1000) - keratometryDioptres;
  return atCornea / (1 + (vertexMm / 1000) * atCornea);
};

/**
 * Change of the spectacle correction, D, when an emmetropic pseudophake lengthens by so many mm (thin lens, vergence; computed).
 * Negative: more myopic.
 */
export const shiftFromLengthening = (lengtheningMm: number, optics: Optics = opticsDefaults): number =>
  correction({ ...optics, axialLengthMm: optics.axialLengthMm + lengtheningMm }, emmetropicLens(optics));

/**
 * Published lengthening after an encircling band, mm: +0.83 (BMC Ophthalmol 2021) to +0.99 (Smiddy 1989), with −1.35 and −2.75 D (read).
 */
export const publishedBand = { lengtheningMm: [0.83, 0.99], shiftDioptres: [-2.75, -1.35] } as const;

/** Observed D per mm of axial lengthening: 1.6 to 2.8 (read). */
export const dioptresPerMm = [1.6, 2.8] as const;
