import { hoursApart, onArc, showClock } from '../../../anatomy/clock.ts';
import { rectusClock } from '../../../anatomy/insertions.ts';
import { defineRule } from '../../define-rule.ts';
import { elementsOf, labelOf, listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'muscle-off-the-segment',
  family: 'buckle',
  level: 'contradiction',
  title: 'A segment recorded under a muscle where it does not lie, or not under one that it crosses',
  why: 'Either the place of the element or the side of the muscle is wrong.',
  source: { text: 'Lateral rectus at 9 o’clock in a right eye and 3 o’clock in a left', certainty: 'P' },
  answerable: false,
  check: (record) => {
    const eye = record.who?.eye;
    if (eye === undefined) return [];
    const recti = ['medial', 'superior', 'lateral', 'inferior'] as const;
    return elementsOf(record).flatMap(({ role, fromClock, toClock, underMuscles }, index) => {
      if (
        role !== 'segment' ||
        fromClock === undefined ||
        toClock === undefined ||
        underMuscles === undefined
      )
        return [];
      const arc = { from: fromClock, to: toClock };
      const depth = (clock: number) =>
        (onArc(clock, arc) ? 1 : -1) * Math.min(hoursApart(clock, fromClock), hoursApart(clock, toClock));
      const wrong = recti.filter((muscle) =>
        underMuscles.includes(muscle)
          ? depth(rectusClock(muscle, eye)) < -1.25
          : depth(rectusClock(muscle, eye)) > 1.25,
      );
      if (wrong.length === 0) return [];
      const said = wrong.map(
        (muscle) =>
          `${underMuscles.includes(muscle) ? 'under' : 'not under'} the ${labelOf('buckle.elements.underMuscles', muscle)}`,
      );
      return [
        {
          fields: [`buckle.elements.${index}.underMuscles`, `buckle.elements.${index}.fromClock`, 'who.eye'],
          message: `Element ${index + 1} runs from ${showClock(fromClock)} to ${showClock(toClock)} in the ${eye} eye, and is recorded ${listWords(said)}.`,
        },
      ];
    });
  },
  examples: {
    fires: [
      {
        name: 'the muscle of the other side',
        fields: 'buckle.elements.0.underMuscles',
        record: {
          who: { eye: 'right' },
          buckle: {
            elements: [{ role: 'segment', fromClock: 7.5, toClock: 10.5, underMuscles: ['medial'] }],
          },
        },
      },
      {
        name: 'a muscle left out',
        fields: 'buckle.elements.0.underMuscles',
        record: {
          who: { eye: 'right' },
          buckle: { elements: [{ role: 'segment', fromClock: 7, toClock: 1.5, underMuscles: ['superior'] }] },
        },
      },
    ],
    silent: [
      {
        name: 'as it lies',
        record: {
          who: { eye: 'right' },
          buckle: {
            elements: [{ role: 'segment', fromClock: 7.5, toClock: 10.5, underMuscles: ['lateral'] }],
          },
        },
      },
    ],
    unknown: [
      {
        name: 'muscles not recorded',
        record: {
          who: { eye: 'right' },
          buckle: { elements: [{ role: 'segment', fromClock: 7.5, toClock: 10.5 }] },
        },
      },
    ],
  },
});
