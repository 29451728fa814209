import { heightFromShortening } from '../../../physics/band.ts';
import { defineRule } from '../../define-rule.ts';
import { elementsOf, isEncircling, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'height-above-bound',
  family: 'tension',
  level: 'contradiction',
  title: 'More height than the shortening can give',
  why: 'One of the two was misread; a shortening without effect may mean a slipped join.',
  source: { text: 'h = ΔL/2π, an upper bound: IOVS abstract 2357577', certainty: 'R' },
  answerable: false,
  check: (record) =>
    elementsOf(record).flatMap((element, index) => {
      const { shortenedMm, heightMm, form } = element;
      if (
        !isEncircling(element) ||
        shortenedMm === undefined ||
        heightMm === undefined ||
        form === undefined ||
        element.imbricatedOver !== undefined
      )
        return [];
      // The bound is for a flush, thin band on its own: thickness and sutures that sink it add to what is seen.
      const others =
        elementsOf(record).length > 1 || form === 'tyre' || form === 'round-sponge' || form === 'oval-sponge';
      const most = heightFromShortening(shortenedMm) + Math.min(element.thicknessMm ?? 2, 2) + 0.75;
      if (others || heightMm <= most) return [];
      const message = `Shortened by ${numberWords(shortenedMm)} mm, the band gives at most ${numberWords(Math.round(heightFromShortening(shortenedMm) * 10) / 10)} mm of height and its own thickness; ${numberWords(heightMm)} mm is recorded.`;
      return [
        { fields: [`buckle.elements.${index}.heightMm`, `buckle.elements.${index}.shortenedMm`], message },
      ];
    }),
  examples: {
    fires: [
      {
        name: '4 mm of height from 3 mm',
        fields: 'buckle.elements.0.heightMm',
        record: { buckle: { elements: [{ role: 'encircling', form: 'band', shortenedMm: 3, heightMm: 4 }] } },
      },
    ],
    silent: [
      {
        name: '0.8 mm from 5 mm',
        record: {
          buckle: { elements: [{ role: 'encircling', form: 'band', shortenedMm: 5, heightMm: 0.8 }] },
        },
      },
    ],
    unknown: [
      {
        name: 'height not recorded',
        record: { buckle: { elements: [{ role: 'encircling', shortenedMm: 5 }] } },
      },
    ],
  },
});
