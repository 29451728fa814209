import { arcOfFill, coverDegrees, positionsThatCover } from '../bubble.ts';
import type { Figure } from '../figure.ts';
import { layBreak } from '../support.ts';
import { type Ground, round } from './ground.ts';

/** The wall that the tamponade touches, and which posture covers which break. */
export const bubbleFigures = ({ record, globe, eye, assumed }: Ground): Figure[] => {
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
