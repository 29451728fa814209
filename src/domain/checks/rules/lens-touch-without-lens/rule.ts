import { defineRule } from '../../define-rule.ts';
import { complicationsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'lens-touch-without-lens',
  family: 'vitreous',
  level: 'contradiction',
  title: 'A lens touch in an eye without its own lens',
  why: 'Lens state decides refraction, oil and the next operation.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: (record) => {
    const lens = record.before?.lens;
    const at = complicationsOf(record).findIndex(({ kind }) => kind === 'lens-touch');
    if ((lens !== 'pseudophakic' && lens !== 'aphakic') || at < 0) return [];
    return [
      {
        fields: [`endOfCase.complications.${at}.kind`, 'before.lens'],
        message: `A lens touch is recorded; the eye is ${lens}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'pseudophakic',
        fields: 'endOfCase.complications.0.kind',
        record: { before: { lens: 'pseudophakic' }, endOfCase: { complications: [{ kind: 'lens-touch' }] } },
      },
    ],
    silent: [
      {
        name: 'phakic',
        record: { before: { lens: 'phakic' }, endOfCase: { complications: [{ kind: 'lens-touch' }] } },
      },
    ],
    unknown: [
      { name: 'lens not recorded', record: { endOfCase: { complications: [{ kind: 'lens-touch' }] } } },
    ],
  },
});
