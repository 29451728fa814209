import { insertionMm } from '../../anatomy/insertions.ts';
import type { BuckleElement, Eye } from '../../record/schema.ts';
import { curveLengthMm, heightFromShortening, overlapMm } from '../band.ts';
import type { Figure } from '../figure.ts';
import { opticsDefaults, publishedBand, shiftFromLengthening } from '../refraction.ts';
import { strengthLeft } from '../sutures.ts';
import { type Ground, IOVS_SPIRAL, round } from './ground.ts';

const frontAt = (element: BuckleElement, eye: Eye) => {
  const { frontEdgeMm, frontEdgeReference } = element;
  if (frontEdgeMm === undefined || frontEdgeReference === undefined) return undefined;
  return (clock: number) => (frontEdgeReference === 'insertions' ? insertionMm(clock, eye) : 0) + frontEdgeMm;
};

const placementFigures = (element: BuckleElement, index: number, ground: Ground): Figure[] => {
  const { globe, eye, axialLengthMm, assumed } = ground;
  const front = frontAt(element, eye);
  if (front === undefined || element.role !== 'encircling') return [];
  const half = (element.widthMm ?? 0) / 2;
  const length = curveLengthMm(globe, (clock) => front(clock) + half, { from: 6, to: 6 });
  const fronts = [12, 3, 6, 9].map(front);
  const [least, most] = [round(Math.min(...fronts)), round(Math.max(...fronts))];
  const where = least === most ? `${least} mm` : `${least} to ${most} mm`;
  const inputs = { axialLengthMm, frontEdgeMm: element.frontEdgeMm ?? 0, widthMm: element.widthMm ?? 0 };
  const fields = [`buckle.elements.${index}.frontEdgeMm`];
  const figures: Figure[] = [
    {
      id: 'band-length',
      name: `Length round the globe at element ${index + 1}`,
      value: round(length),
      unit: 'mm',
      formula: '∮ √((R dθ)² + (R·sin θ dφ)²) along the middle of the band',
      inputs,
      assumed,
      source: `${IOVS_SPIRAL}; sphere (computed)`,
      fields,
      sentence: `Front edge ${where} behind the limbus; about ${Math.round(length)} mm round the globe here (an estimate).`,
    },
  ];
  if (element.lengthMm !== undefined) {
    const overlap = overlapMm(element.lengthMm, length, element.shortenedMm ?? 0);
    figures.push({
      id: 'band-overlap',
      name: `Overlap of element ${index + 1}`,
      value: round(overlap),
      unit: 'mm',
      formula: 'length − (length round the globe − shortening)',
      inputs: { ...inputs, lengthMm: element.lengthMm, shortenedMm: element.shortenedMm ?? 0 },
      assumed,
      source: 'Computed',
      fields: [`buckle.elements.${index}.lengthMm`],
      sentence:
        overlap >= 0
          ? `About ${Math.round(overlap)} mm of overlap (an estimate).`
          : `About ${Math.round(-overlap)} mm short of meeting (an estimate).`,
    });
  }
  return figures;
};

const tensionFigures = (
  element: BuckleElement,
  index: number,
  { axialLengthMm, assumed, record }: Ground,
): Figure[] => {
  const { shortenedMm, role } = element;
  if (role !== 'encircling' || shortenedMm === undefined || shortenedMm <= 0) return [];
  const height = round(heightFromShortening(shortenedMm), 2);
  const optics = {
    ...opticsDefaults,
    axialLengthMm,
    keratometryDioptres: record.before?.keratometryDioptres ?? opticsDefaults.keratometryDioptres,
  };
  const [shortest, longest] = publishedBand.lengtheningMm;
  const [more, less] = [shiftFromLengthening(longest, optics), shiftFromLengthening(shortest, optics)];
  const low = round(Math.min(more, publishedBand.shiftDioptres[0]));
  const high = round(Math.max(less, publishedBand.shiftDioptres[1]));
  const fields = [`buckle.elements.${index}.shortenedMm`];
  return [
    {
      id: 'shortening-height',
      name: `Height of element ${index + 1}, at most`,
      value: height,
      unit: 'mm',
      formula: 'h = ΔL/2π',
      inputs: { shorteningMm: shortenedMm },
      assumed: [],
      source: 'IOVS abstract 2357577 (read); an upper bound for a flush, inelastic band',
      fields,
      sentence: `${shortenedMm} mm of shortening gives at most ${round(height)} mm of height all round (an estimate).`,
    },
    {
      id: 'band-refraction',
      name: 'Change of refraction after the band',
      low,
      high,
      unit: 'D',
      formula: 'vergence of a thin-lens eye lengthened by 0.83 to 0.99 mm, and the published shifts',
      inputs: { axialLengthMm, keratometryDioptres: optics.keratometryDioptres },
      assumed: [
        ...assumed,
        ...(record.before?.keratometryDioptres === undefined ? ['a keratometry of 43.5 D'] : []),
      ],
      source: 'Smiddy, Arch Ophthalmol 1989;107:1469; BMC Ophthalmol 2021 s12886-021-01928-0 (read)',
      fields,
      sentence: `Published bands changed refraction by about ${String(high).replace('-', '−')} to ${String(low).replace('-', '−')} D (an estimate).`,
    },
  ];
};

const sutureFigures = (element: BuckleElement, index: number): Figure[] => {
  const closure = typeof element.closure === 'object' ? element.closure : undefined;
  const material = closure?.material;
  if (material === undefined || material === 'not-applicable') return [];
  const after = strengthLeft(material, 28);
  if (after === undefined || after.low === 1) return [];
  return [
    {
      id: 'suture-strength',
      name: `Strength left in the join of element ${index + 1} at 4 weeks`,
      value: round(after.low * 100),
      unit: '%',
      formula: 'published curve',
      inputs: { material, day: 28 },
      assumed: [],
      source: 'Polyglactin 910: 25% at 4 weeks; polydioxanone: 50% (read)',
      fields: [`buckle.elements.${index}.closure.material`],
      sentence: `About ${round(after.low * 100)}% of its strength is left at 4 weeks (published curve).`,
    },
  ];
};

/** What follows from each element: its way round the globe, height, refraction, and what its join still holds. */
export const bandFigures = (ground: Ground): Figure[] => {
  const elements = Array.isArray(ground.record.buckle?.elements) ? ground.record.buckle.elements : [];
  return elements.flatMap((element, index) => [
    ...placementFigures(element, index, ground),
    ...tensionFigures(element, index, ground),
    ...sutureFigures(element, index),
  ]);
};
