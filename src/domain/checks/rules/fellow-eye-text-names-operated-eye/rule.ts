import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'fellow-eye-text-names-operated-eye',
  family: 'side',
  level: 'caution',
  title: 'The findings of the fellow eye name the operated eye',
  why: 'The fellow eye’s breaks are treated from this text.',
  source: { text: 'Elghrably, Eye 2008;22:340', certainty: 'R' },
  answerable: true,
  check: ({ who, before }) => {
    const text = before?.fellowEye;
    if (who?.eye === undefined || text === undefined) return [];
    const named = new Set(
      [...text.matchAll(/\b(right|left) (?:eye|retina|fundus|macula)\b/gi)].map((match) =>
        match[1]?.toLowerCase(),
      ),
    );
    if (named.size !== 1 || !named.has(who.eye)) return [];
    return [
      {
        fields: ['before.fellowEye', 'who.eye'],
        message: `The findings of the fellow eye speak of the ${who.eye} eye, which was operated on.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'operated eye named',
        fields: 'before.fellowEye',
        record: { who: { eye: 'left' }, before: { fellowEye: 'Left eye: lattice from 5 to 7, no break.' } },
      },
    ],
    silent: [
      {
        name: 'the fellow',
        record: { who: { eye: 'left' }, before: { fellowEye: 'Right eye: lattice, no break.' } },
      },
      {
        name: 'both compared',
        record: { who: { eye: 'left' }, before: { fellowEye: 'Right eye flat, unlike the left eye.' } },
      },
    ],
    unknown: [{ name: 'eye not recorded', record: { before: { fellowEye: 'Left eye: lattice.' } } }],
  },
});
