import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'supervisor-for-trainee',
  family: 'team',
  level: 'omission',
  title: 'A trainee as surgeon without a word on supervision',
  why: 'Who was responsible in theatre is asked when things go wrong.',
  source: {
    text: '42 CFR 482.51(b)(6), tag A-0959: surgeons and assistants and what each did',
    certainty: 'R2',
  },
  answerable: true,
  check: ({ who }) => {
    const role = who?.surgeon?.role;
    if (
      role === undefined ||
      who?.supervisor !== undefined ||
      !/train|regist|resident|fellow|junior/i.test(role)
    )
      return [];
    return [
      {
        fields: ['who.supervisor'],
        message: `The surgeon is recorded as ${role}; the supervisor, or that there was none, is not.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'registrar',
        fields: 'who.supervisor',
        record: { who: { surgeon: { role: 'Specialty registrar' } } },
      },
    ],
    silent: [
      {
        name: 'supervised',
        record: {
          who: {
            surgeon: { role: 'Specialty registrar' },
            supervisor: { name: 'A. Surgeon', scrubbed: true },
          },
        },
      },
    ],
    unknown: [{ name: 'role not recorded', record: { who: { surgeon: { name: 'A. Surgeon' } } } }],
  },
});
