import { isAbsorbable } from '../../../physics/sutures.ts';
import { defineRule } from '../../define-rule.ts';
import { elementsOf, fixationsOf, isEncircling, labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'temporary-element-without-removal-plan',
  family: 'closure',
  level: 'omission',
  title: 'A temporary element held by lasting sutures and no plan to take it out',
  why: 'Nobody removes what nobody planned to remove.',
  source: { text: 'Nylon and polyester last', certainty: 'P' },
  answerable: true,
  check: (record) =>
    elementsOf(record).flatMap((element, index) => {
      const held = fixationsOf(element);
      if (
        isEncircling(element) ||
        element.role === undefined ||
        element.intention !== 'temporary' ||
        held.length === 0
      )
        return [];
      const lasting = held.every(
        ({ kind, material }) =>
          kind === 'mattress-suture' &&
          material !== undefined &&
          material !== 'not-applicable' &&
          !isAbsorbable(material),
      );
      if (
        !lasting ||
        record.aftercare?.elementRemovalInMonths !== undefined ||
        record.aftercare?.nextOperationOn !== undefined
      )
        return [];
      return [
        {
          fields: ['aftercare.elementRemovalInMonths', `buckle.elements.${index}.intention`],
          message: `Element ${index + 1} is intended to be temporary and is held by lasting sutures (${labelOf('buckle.elements.fixation.material', held[0]?.material ?? '')}); no removal is planned.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'nylon, no plan',
        fields: 'aftercare.elementRemovalInMonths',
        record: {
          buckle: {
            elements: [
              {
                role: 'segment',
                intention: 'temporary',
                fixation: [{ kind: 'mattress-suture', material: 'nylon' }],
              },
            ],
          },
        },
      },
    ],
    silent: [
      {
        name: 'absorbable sutures',
        record: {
          buckle: {
            elements: [
              {
                role: 'segment',
                intention: 'temporary',
                fixation: [{ kind: 'mattress-suture', material: 'polyglactin-910' }],
              },
            ],
          },
        },
      },
      {
        name: 'planned',
        record: {
          buckle: {
            elements: [
              {
                role: 'segment',
                intention: 'temporary',
                fixation: [{ kind: 'mattress-suture', material: 'nylon' }],
              },
            ],
          },
          aftercare: { elementRemovalInMonths: 3 },
        },
      },
    ],
    unknown: [
      {
        name: 'material not recorded',
        record: {
          buckle: {
            elements: [{ role: 'segment', intention: 'temporary', fixation: [{ kind: 'mattress-suture' }] }],
          },
        },
      },
    ],
  },
});
