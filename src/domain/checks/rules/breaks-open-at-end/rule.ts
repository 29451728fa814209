import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'breaks-open-at-end',
  family: 'breaks',
  level: 'caution',
  title: 'Breaks not closed at the end, and no tamponade to close them',
  why: 'An open break detaches the retina again; if fluid is expected to go over the buckle, the note says so.',
  source: { text: 'Tears need 5–7 mm of support', certainty: 'R' },
  answerable: true,
  unless: ['break-unsupported', 'detachment-left-open'],
  check: (record) => {
    const closed = record.endOfCase?.breaksClosed;
    if ((closed !== 'none' && closed !== 'some') || record.tamponade?.agent !== 'none') return [];
    if (
      record.drainage?.kind === 'none' ||
      record.breaks?.found === 'none' ||
      record.vitreous?.heavyLiquid === 'left'
    )
      return [];
    return [
      {
        fields: ['endOfCase.breaksClosed', 'tamponade.agent'],
        message: `Breaks on the buckle or flat at the end: ${closed}; the tamponade is recorded as none.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'some open',
        fields: 'endOfCase.breaksClosed',
        record: {
          drainage: { kind: 'external' },
          tamponade: { agent: 'none' },
          endOfCase: { breaksClosed: 'some' },
        },
      },
    ],
    silent: [
      {
        name: 'not drained: the fluid goes later',
        record: {
          drainage: { kind: 'none' },
          tamponade: { agent: 'none' },
          endOfCase: { breaksClosed: 'none' },
        },
      },
      { name: 'all closed', record: { tamponade: { agent: 'none' }, endOfCase: { breaksClosed: 'all' } } },
    ],
    unknown: [{ name: 'tamponade not recorded', record: { endOfCase: { breaksClosed: 'some' } } }],
  },
});
