import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'one-person-in-two-roles',
  family: 'team',
  level: 'caution',
  title: 'The same person as surgeon and assistant, supervisor or anaesthetist',
  why: 'Probably a name in the wrong field.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: true,
  check: ({ who }) => {
    const surgeon = who?.surgeon?.name?.toLowerCase();
    if (surgeon === undefined) return [];
    const others = [
      ...(Array.isArray(who?.assistants)
        ? who.assistants.map(({ name }, index) => ({
            name,
            field: `who.assistants.${index}.name`,
            as: 'assistant',
          }))
        : []),
      {
        name: typeof who?.supervisor === 'object' ? who.supervisor.name : undefined,
        field: 'who.supervisor',
        as: 'supervisor',
      },
      { name: who?.anaesthetist, field: 'who.anaesthetist', as: 'anaesthetist' },
    ];
    return others
      .filter(({ name }) => name?.toLowerCase() === surgeon)
      .map(({ name, field, as }) => ({
        fields: [field, 'who.surgeon.name'],
        message: `${name} is recorded as surgeon and as ${as}.`,
      }));
  },
  examples: {
    fires: [
      {
        name: 'assistant',
        fields: 'who.assistants.0.name',
        record: { who: { surgeon: { name: 'A. Surgeon' }, assistants: [{ name: 'A. Surgeon' }] } },
      },
    ],
    silent: [
      {
        name: 'two people',
        record: { who: { surgeon: { name: 'A. Surgeon' }, assistants: [{ name: 'B. Helper' }] } },
      },
    ],
    unknown: [{ name: 'surgeon not recorded', record: { who: { assistants: [{ name: 'B. Helper' }] } } }],
  },
});
