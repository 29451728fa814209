import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'trainee-without-supervisor',
  family: 'team',
  level: 'caution',
  title: 'A trainee operated, and the supervisor is recorded as none',
  why: 'Who was responsible in theatre is asked when things go wrong.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: ({ who }) => {
    const role = who?.surgeon?.role;
    if (role === undefined || who?.supervisor !== 'none' || !/train|registrar|resident|junior/i.test(role))
      return [];
    return [
      {
        fields: ['who.supervisor', 'who.surgeon.role'],
        message: `The surgeon is recorded as ${role}, and the supervisor as none.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'trainee alone',
        fields: 'who.supervisor',
        record: { who: { surgeon: { role: 'trainee' }, supervisor: 'none' } },
      },
    ],
    silent: [
      { name: 'consultant', record: { who: { surgeon: { role: 'consultant' }, supervisor: 'none' } } },
      {
        name: 'a fellow working alone',
        record: { who: { surgeon: { role: 'fellow' }, supervisor: 'none' } },
      },
    ],
    unknown: [{ name: 'role not recorded', record: { who: { supervisor: 'none' } } }],
  },
});
