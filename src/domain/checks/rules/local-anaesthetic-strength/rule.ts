import { defineRule } from '../../define-rule.ts';
import { numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'local-anaesthetic-strength',
  family: 'medicines',
  level: 'contradiction',
  title: 'A local anaesthetic of a strength that is not made',
  why: 'A decimal point in the wrong place is a tenfold dose.',
  source: {
    text: 'Lidocaine to 4%, bupivacaine and levobupivacaine to 0.75%, ropivacaine to 1%',
    certainty: 'M',
  },
  answerable: false,
  check: ({ anaesthesia }) => {
    const agents = Array.isArray(anaesthesia?.agents) ? anaesthesia.agents : [];
    const strongest: readonly (readonly [RegExp, number])[] = [
      [/bupivacaine/i, 0.75],
      [/ropivacaine/i, 1],
      [/mepivacaine/i, 3],
      [/prilocaine/i, 4],
      [/li[dg]n?ocaine|articaine/i, 4],
    ];
    return agents.flatMap(({ drug = '', concentrationPercent: percent }, index) => {
      const most = strongest.find(([name]) => name.test(drug))?.[1];
      if (most === undefined || percent === undefined || percent <= most) return [];
      return [
        {
          fields: [`anaesthesia.agents.${index}.concentrationPercent`],
          message: `${drug} is recorded at ${numberWords(percent)}%; it is made up to ${numberWords(most)}%.`,
        },
      ];
    });
  },
  examples: {
    fires: [
      {
        name: '5% for 0.5%',
        fields: 'anaesthesia.agents.0.concentrationPercent',
        record: { anaesthesia: { agents: [{ drug: 'Bupivacaine', concentrationPercent: 5 }] } },
      },
    ],
    silent: [
      {
        name: 'as made',
        record: {
          anaesthesia: {
            agents: [
              { drug: 'Lidocaine', concentrationPercent: 2 },
              { drug: 'levobupivacaine', concentrationPercent: 0.75 },
            ],
          },
        },
      },
    ],
    unknown: [
      { name: 'strength not recorded', record: { anaesthesia: { agents: [{ drug: 'Bupivacaine' }] } } },
    ],
  },
});
