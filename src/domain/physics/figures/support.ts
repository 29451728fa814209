import { showClock } from '../../anatomy/clock.ts';
import type { Figure } from '../figure.ts';
import { holds, layBreak, layElement, supportBy, supportByAll } from '../support.ts';
import { type Ground, IOVS_SPIRAL, round } from './ground.ts';

/** For each break, whether the elements lie under it. */
export const supportFigures = ({ record, globe, eye, assumed }: Ground): Figure[] => {
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
