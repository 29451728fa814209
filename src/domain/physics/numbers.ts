import { showClock } from '../anatomy/clock.ts';
import { defaults, equatorMm, type Globe, globeOf } from '../anatomy/globe.ts';
import { insertionMm } from '../anatomy/insertions.ts';
import type { BuckleElement, CaseRecord, Eye } from '../record/schema.ts';
import { curveLengthMm, heightFromShortening, overlapMm } from './band.ts';
import { arcOfFill, cavityMl, coverDegrees, positionsThatCover } from './bubble.ts';
import type { Figure } from './figure.ts';
import {
  expansionOf,
  gasFacts,
  halfLifeDays,
  isGas,
  percentOf,
  pressures,
  pureMl,
  spanDays,
  volumeAtPressure,
} from './gas.ts';
import { opticsDefaults, publishedBand, shiftFromLengthening } from './refraction.ts';
import { holds, layBreak, layElement, supportBy, supportByAll } from './support.ts';
import { strengthLeft } from './sutures.ts';

export type { Figure } from './figure.ts';

const round = (value: number, places = 1): number => Math.round(value * 10 ** places) / 10 ** places;

interface Ground {
  record: CaseRecord;
  globe: Globe;
  eye: Eye;
  axialLengthMm: number;
  assumed: string[];
}

const groundOf = (record: CaseRecord): Ground => {
  const measured = record.before?.axialLengthMm;
  const axialLengthMm = measured ?? defaults.axialLengthMm;
  const eye = record.who?.eye;
  return {
    record,
    globe: globeOf(axialLengthMm),
    eye: eye ?? 'right',
    axialLengthMm,
    assumed: [
      ...(measured === undefined ? [`an axial length of ${defaults.axialLengthMm} mm`] : []),
      ...(eye === undefined ? ['a right eye'] : []),
    ],
  };
};

const IOVS_SPIRAL = 'Spiral of Tillaux, IOVS 2022;63:1877 (read)';
const GAS_ALERT = 'Royal College of Ophthalmologists safety alert, 18 December 2018 (read)';

const globeFigures = ({ globe, axialLengthMm, assumed, record }: Ground): Figure[] =>
  record.before?.axialLengthMm === undefined
    ? []
    : [
        {
          id: 'equator-arc',
          name: 'Equator behind the limbus',
          value: round(equatorMm(globe)),
          unit: 'mm',
          formula: 'R·(π/2 − θ0)',
          inputs: { axialLengthMm },
          assumed,
          source: 'Sphere; limbus radius 5.9 mm (computed)',
          fields: ['before.axialLengthMm'],
          sentence: `The equator lies about ${round(equatorMm(globe))} mm behind the limbus (an estimate).`,
        },
      ];

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

const supportFigures = ({ record, globe, eye, assumed }: Ground): Figure[] => {
  const elements = Array.isArray(record.buckle?.elements) ? record.buckle.elements : [];
  const laid = elements.flatMap((element) => layElement(element, globe, eye) ?? []);
  if (laid.length === 0 || !Array.isArray(record.breaks?.found)) return [];
  return record.breaks.found.flatMap((found, index): Figure[] => {
    const lying = layBreak(found, globe, eye);
    if (lying === undefined) return [];
    const { shortfallMm, bare } = supportByAll(lying, laid);
    const best = laid.flatMap((element) => supportBy(lying, element) ?? []).find(holds);
    const place = lying.fromZone ? [...assumed, 'edges from the zone'] : assumed;
    const sentence =
      bare === 1
        ? `No element lies at ${showClock(lying.clock)} (an estimate).`
        : shortfallMm > 0
          ? `About ${round(shortfallMm)} mm of it not on an element (an estimate).`
          : best === undefined
            ? 'Held by the elements together (an estimate).'
            : `On an element, about ${round(best.frontMm)} mm in front and ${round(best.backMm)} mm behind to spare (an estimate).`;
    return [
      {
        id: 'break-support',
        name: `Break ${index + 1} not on an element`,
        value: round(shortfallMm),
        unit: 'mm',
        formula: 'length of the break’s depth that no element’s edges enclose',
        inputs: { clock: lying.clock, frontMm: round(lying.frontMm), backMm: round(lying.backMm) },
        assumed: place,
        source: IOVS_SPIRAL,
        fields: [`breaks.found.${index}.${lying.fromZone ? 'zone' : 'frontEdgeMm'}`],
        sentence,
      },
    ];
  });
};

const gasFigures = ({ record, globe, assumed }: Ground): Figure[] => {
  const tamponade = record.tamponade;
  const gas = tamponade?.agent;
  if (!isGas(gas) || tamponade === undefined) return [];
  const figures: Figure[] = [];
  const recorded =
    typeof tamponade.concentrationPercent === 'number' ? tamponade.concentrationPercent : undefined;
  const percent = tamponade.mixing === 'pure' ? 100 : (recorded ?? gasFacts[gas].isoexpansile.usual);
  const guessed =
    recorded === undefined && tamponade.mixing !== 'pure' && gas !== 'air' ? [`${percent}%`] : [];
  const lens = record.before?.lens === 'aphakic' ? 'aphakic' : 'phakic';
  const { syringeMl, pureMl: pure, volumeMl, fillPercent } = tamponade;
  if (syringeMl !== undefined && recorded !== undefined && gas !== 'air') {
    figures.push({
      id: 'gas-dilution-pure-ml',
      name: 'Pure gas to draw up',
      value: round(pureMl(syringeMl, recorded), 2),
      unit: 'mL',
      formula: 'syringe mL × %',
      inputs: { syringeMl, percent: recorded },
      assumed: [],
      source: 'Computed',
      fields: ['tamponade.pureMl'],
      sentence: `${recorded}% in ${syringeMl} mL is ${round(pureMl(syringeMl, recorded), 2)} mL of pure gas.`,
    });
  }
  if (syringeMl !== undefined && pure !== undefined && syringeMl > 0 && gas !== 'air') {
    figures.push({
      id: 'gas-dilution-percent',
      name: 'Concentration made',
      value: round(percentOf(pure, syringeMl)),
      unit: '%',
      formula: 'pure mL / syringe mL',
      inputs: { syringeMl, pureMl: pure },
      assumed: [],
      source: 'Computed',
      fields: ['tamponade.concentrationPercent'],
      sentence: `${pure} mL in ${syringeMl} mL makes ${round(percentOf(pure, syringeMl))}%.`,
    });
  }
  const span = spanDays(gas, percent, lens);
  const half = halfLifeDays(gas, percent, lens);
  figures.push(
    {
      id: 'gas-half-life',
      name: 'Half-life of the gas',
      low: round(half.low),
      high: round(half.high),
      unit: 'days',
      formula: 'published half-lives around this concentration',
      inputs: { gas, percent, lens },
      assumed: guessed,
      source: 'Thompson, Arch Ophthalmol 1989;107:687 and 1992;110:1594 (read)',
      fields: ['tamponade.concentrationPercent'],
      sentence: `Half-life about ${half.low === half.high ? round(half.low) : `${round(half.low)} to ${round(half.high)}`} days (an estimate).`,
    },
    {
      id: 'gas-span',
      name: 'How long the gas may last',
      low: Math.round(span.low),
      high: Math.round(span.high),
      unit: 'days',
      formula: 't½·log2(10) to t½·log2(100), and the published span',
      inputs: { gas, percent, lens },
      assumed: guessed,
      source: `${GAS_ALERT}; Thompson 1989, 1992 (read)`,
      fields: ['tamponade.agent'],
      sentence: `May last about ${Math.round(span.low)} to ${Math.round(span.high)} days or longer (an estimate); only an examination shows that it has gone.`,
    },
    {
      id: 'gas-expansion',
      name: 'Growth of the gas in the eye',
      value: round(expansionOf(gas, percent), 2),
      unit: 'times',
      formula: '1 + (pure expansion − 1)·(% − isoexpansile)/(100 − isoexpansile), not below 1',
      inputs: { gas, percent },
      assumed: guessed,
      source: `${GAS_ALERT}; in between a straight line (computed)`,
      fields: ['tamponade.concentrationPercent'],
      sentence:
        expansionOf(gas, percent) > 1.05
          ? `Grows to about ${round(expansionOf(gas, percent), 1)} times (an estimate).`
          : 'Does not grow at this concentration (an estimate).',
    },
  );
  const put =
    volumeMl ??
    (fillPercent === undefined ? undefined : (cavityMl(globe.cavityRadiusMm) * fillPercent) / 100);
  if (put !== undefined) {
    const high = volumeAtPressure(put, pressures.cabinMmHg);
    figures.push({
      id: 'altitude-volume',
      name: 'Volume at cabin pressure if the eye could stretch',
      value: round(high, 2),
      unit: 'mL',
      formula: 'V·760/564 (Boyle)',
      inputs: { volumeMl: round(put, 2), pressureMmHg: pressures.cabinMmHg },
      assumed: volumeMl === undefined ? assumed : [],
      source: 'Cabin about 8,000 ft, 564 mmHg (computed)',
      fields: ['tamponade.volumeMl'],
      sentence: `${round(put, 1)} mL would become about ${round(high, 1)} mL in an aircraft cabin (an estimate): no flying with gas.`,
    });
  }
  return figures;
};

const bubbleFigures = ({ record, globe, eye, assumed }: Ground): Figure[] => {
  const agent = record.tamponade?.agent;
  const fill = record.tamponade?.fillPercent;
  if (agent === undefined || agent === 'none' || fill === undefined) return [];
  const buoyancy = agent === 'heavy-oil' ? 'sinks' : 'floats';
  const arc = round(arcOfFill(fill / 100), 0);
  const figures: Figure[] = [
    {
      id: 'bubble-fill-angle',
      name: 'Arc of wall that the tamponade touches',
      value: arc,
      unit: '°',
      formula: 'V = πh²(3R − h)/3, h = R(1 − cos(θ/2))',
      inputs: { fillPercent: fill },
      assumed: ['a sphere and a flat fluid surface'],
      source: 'Cap of a sphere (computed)',
      fields: ['tamponade.fillPercent'],
      sentence: `Touches about ${arc}° of wall at this fill (an estimate).`,
    },
  ];
  const postures = Array.isArray(record.aftercare?.posture) ? record.aftercare.posture : [];
  if (!Array.isArray(record.breaks?.found)) return figures;
  record.breaks.found.forEach((found, index) => {
    const lying = layBreak(found, globe, eye);
    if (lying === undefined) return;
    const place = { clock: lying.clock, mm: (lying.frontMm + lying.backMm) / 2 };
    postures.forEach(({ position }, at) => {
      if (position === undefined) return;
      const cover = coverDegrees(globe, place, fill / 100, position, buoyancy);
      if (cover === undefined) return;
      const others = positionsThatCover(globe, place, fill / 100, buoyancy).slice(0, 3);
      figures.push({
        id: 'bubble-cover',
        name: `Cover of break ${index + 1} in posture ${at + 1}`,
        value: round(cover, 0),
        unit: '°',
        formula: 'half the arc in contact − angle between the break and the highest point',
        inputs: { clock: place.clock, mm: round(place.mm), fillPercent: fill, position },
        assumed: lying.fromZone ? [...assumed, 'edges from the zone'] : assumed,
        source: 'Cap of a sphere (computed)',
        fields: [`aftercare.posture.${at}.position`],
        sentence:
          cover >= 0
            ? `Covers break ${index + 1} with about ${round(cover, 0)}° to spare (an estimate).`
            : `Misses break ${index + 1} by about ${round(-cover, 0)}° (an estimate); ${others.length === 0 ? 'no position covers it' : `covered when ${others.map((one) => one.replaceAll('-', ' ')).join(', ')}`}.`,
      });
    });
  });
  return figures;
};

/** Every figure that follows from what a record holds so far, in the order of the operation. */
export const numbersOf = (record: CaseRecord): Figure[] => {
  const ground = groundOf(record);
  const elements = Array.isArray(record.buckle?.elements) ? record.buckle.elements : [];
  return [
    ...globeFigures(ground),
    ...supportFigures(ground),
    ...elements.flatMap((element, index) => [
      ...placementFigures(element, index, ground),
      ...tensionFigures(element, index, ground),
      ...sutureFigures(element, index),
    ]),
    ...gasFigures(ground),
    ...bubbleFigures(ground),
  ];
};
