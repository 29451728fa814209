import { showClock } from '../../../anatomy/clock.ts';
import { globeOf } from '../../../anatomy/globe.ts';
import { layBreak, layElement, supportByAll } from '../../../physics/support.ts';
import { defineRule } from '../../define-rule.ts';
import { breaksOf, elementsOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'support-misses-break',
  family: 'buckle',
  level: 'contradiction',
  title: 'An element said to support a break does not lie under it',
  why: 'An element whose edge misses the break leaves it open.',
  source: {
    text: 'Placement on the globe: insertions 5.5 to 7.7 mm behind the limbus, IOVS 2022;63:1877',
    certainty: 'R',
  },
  answerable: false,
  check: (record) => {
    const eye = record.who?.eye;
    if (eye === undefined) return [];
    // A smaller eye is held over more clock hours: where the length is not known, the benefit of the doubt.
    const globe = globeOf(Math.max(record.before?.axialLengthMm ?? 20, 20));
    const elements = elementsOf(record);
    return breaksOf(record).flatMap((found, index) => {
      const { supportedByElements, clock } = found;
      if (!Array.isArray(supportedByElements) || clock === undefined || found.frontEdgeMm === undefined)
        return [];
      const named = supportedByElements.flatMap((number) => elements[number - 1] ?? []);
      const lying = layBreak(found, globe, eye);
      // Without its meridian it is open whether an implant under the band lies along or across it.
      if (named.some(({ role, meridianClock }) => role === 'under-band' && meridianClock === undefined))
        return [];
      const laid = named.map((element) => layElement(element, globe, eye));
      if (lying === undefined || lying.fromZone || laid.length === 0 || laid.includes(undefined)) return [];
      const all = laid.filter((element) => element !== undefined);
      // Beside its whole length, each edge and the middle on its own: a short break beside the element is missed as well.
      const parts = [lying, { ...lying, backMm: lying.frontMm }, { ...lying, frontMm: lying.backMm }];
      const shortfallMm = Math.max(...parts.map((part) => supportByAll(part, all).shortfallMm));
      const middleBare = supportByAll({ ...lying, halfHours: 0 }, all).bare > 0;
      if (!middleBare && supportByAll(lying, all).bare <= 0.4 && shortfallMm <= 1) return [];
      const edges = all.map((element) => element.at(clock)).find((at) => at !== null);
      const message =
        edges === undefined || edges === null
          ? `Break ${index + 1} lies at ${showClock(clock)}; the element said to support it does not reach there.`
          : `Break ${index + 1} reaches from ${numberWords(lying.frontMm)} to ${numberWords(lying.backMm)} mm behind the limbus; the element lies at about ${numberWords(Math.round(edges[0] * 10) / 10)} to ${numberWords(Math.round(edges[1] * 10) / 10)} mm at ${showClock(clock)}.`;
      return [
        {
          fields: [
            `breaks.found.${index}.supportedByElements`,
            `breaks.found.${index}.frontEdgeMm`,
            `buckle.elements.${(supportedByElements[0] ?? 1) - 1}.frontEdgeMm`,
          ],
          message,
        },
      ];
    });
  },
  examples: {
    fires: [
      {
        name: 'too far behind',
        fields: 'breaks.found.0.supportedByElements',
        record: {
          who: { eye: 'left' },
          breaks: { found: [{ clock: 4.5, frontEdgeMm: 15, backEdgeMm: 16.5, supportedByElements: [1] }] },
          buckle: {
            elements: [
              { role: 'encircling', widthMm: 2.5, frontEdgeMm: 3, frontEdgeReference: 'insertions' },
            ],
          },
        },
      },
      {
        name: 'segment elsewhere',
        fields: 'breaks.found.0.supportedByElements',
        record: {
          who: { eye: 'left' },
          breaks: { found: [{ clock: 7, frontEdgeMm: 11, supportedByElements: [1] }] },
          buckle: {
            elements: [
              {
                role: 'segment',
                widthMm: 7,
                fromClock: 1,
                toClock: 4,
                frontEdgeMm: 2,
                frontEdgeReference: 'insertions',
              },
            ],
          },
        },
      },
    ],
    silent: [
      {
        name: 'on the band',
        record: {
          who: { eye: 'left' },
          breaks: { found: [{ clock: 2, frontEdgeMm: 10.5, backEdgeMm: 12, supportedByElements: [1] }] },
          buckle: {
            elements: [
              { role: 'encircling', widthMm: 3.5, frontEdgeMm: 3, frontEdgeReference: 'insertions' },
            ],
          },
        },
      },
    ],
    unknown: [
      {
        name: 'edges not measured',
        record: {
          who: { eye: 'left' },
          breaks: { found: [{ clock: 4.5, zone: 'equator', supportedByElements: [1] }] },
          buckle: {
            elements: [
              { role: 'encircling', widthMm: 2.5, frontEdgeMm: 3, frontEdgeReference: 'insertions' },
            ],
          },
        },
      },
    ],
  },
});
