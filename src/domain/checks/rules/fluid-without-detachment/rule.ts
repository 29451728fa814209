import { defineRule } from '../../define-rule.ts';
import { breaksOf, labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'fluid-without-detachment',
  family: 'diagnosis',
  level: 'contradiction',
  title: 'A break without detachment, and fluid drained or left, or a break on detached retina',
  why: 'With and without detachment are different operations and different codes.',
  source: { text: 'ICD-10-CM H33.0 against H33.3', certainty: 'R' },
  answerable: false,
  unless: ['detachment-without-detachment'],
  check: (record) => {
    const { postoperativeDiagnosis, retina } = record.endOfCase ?? {};
    if (postoperativeDiagnosis !== 'break-without-detachment') return [];
    const name = labelOf('before.diagnosis', postoperativeDiagnosis);
    const field = 'endOfCase.postoperativeDiagnosis';
    if (retina === 'fluid-left' || retina === 'detached') {
      return [
        {
          fields: [field, 'endOfCase.retina'],
          message: `The postoperative diagnosis is ${name}; the retina at the end: ${labelOf('endOfCase.retina', retina)}.`,
        },
      ];
    }
    const kind = record.drainage?.kind;
    if (kind !== undefined && kind !== 'none') {
      return [
        {
          fields: [field, 'drainage.kind'],
          message: `The postoperative diagnosis is ${name}; drainage of subretinal fluid is recorded as ${labelOf('drainage.kind', kind)}.`,
        },
      ];
    }
    const at = breaksOf(record).findIndex(({ onDetachedRetina }) => onDetachedRetina === true);
    return at < 0
      ? []
      : [
          {
            fields: [field, `breaks.found.${at}.onDetachedRetina`],
            message: `The postoperative diagnosis is ${name}; break ${at + 1} is recorded on detached retina.`,
          },
        ];
  },
  examples: {
    fires: [
      {
        name: 'drained',
        fields: 'endOfCase.postoperativeDiagnosis',
        record: {
          drainage: { kind: 'external' },
          endOfCase: { postoperativeDiagnosis: 'break-without-detachment' },
        },
      },
      {
        name: 'fluid left',
        fields: 'endOfCase.postoperativeDiagnosis',
        record: { endOfCase: { postoperativeDiagnosis: 'break-without-detachment', retina: 'fluid-left' } },
      },
      {
        name: 'on detached retina',
        fields: 'endOfCase.postoperativeDiagnosis',
        record: {
          breaks: { found: [{ onDetachedRetina: true }] },
          endOfCase: { postoperativeDiagnosis: 'break-without-detachment' },
        },
      },
    ],
    silent: [
      {
        name: 'flat',
        record: {
          drainage: { kind: 'none' },
          endOfCase: { postoperativeDiagnosis: 'break-without-detachment', retina: 'flat' },
        },
      },
    ],
    unknown: [
      {
        name: 'retina not recorded',
        record: { endOfCase: { postoperativeDiagnosis: 'break-without-detachment' } },
      },
    ],
  },
});
