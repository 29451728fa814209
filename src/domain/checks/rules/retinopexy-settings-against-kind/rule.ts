import { defineRule } from '../../define-rule.ts';
import { capital, labelOf, numberWords, treatmentsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'retinopexy-settings-against-kind',
  family: 'retinopexy',
  level: 'contradiction',
  title: 'Settings of a laser with cryotherapy, or a treatment without a single application',
  why: 'Kind or settings are a slip; the kind decides how soon the break holds.',
  source: { text: 'First whitening of the retina ends a cryo application', certainty: 'P' },
  answerable: false,
  check: (record) =>
    treatmentsOf(record).flatMap(({ modality, powerMilliwatts, applications }, index) => {
      const base = `retinopexy.treatments.${index}`;
      if (modality === undefined) return [];
      const name = capital(labelOf('retinopexy.treatments.modality', modality));
      if (modality === 'cryo' && powerMilliwatts !== undefined && powerMilliwatts > 0) {
        return [
          {
            fields: [`${base}.powerMilliwatts`, `${base}.modality`],
            message: `${name} is recorded with a power of ${numberWords(powerMilliwatts)} mW.`,
          },
        ];
      }
      return applications === 0
        ? [{ fields: [`${base}.applications`], message: `${name} is recorded with 0 applications.` }]
        : [];
    }),
  examples: {
    fires: [
      {
        name: 'cryo with milliwatts',
        fields: 'retinopexy.treatments.0.powerMilliwatts',
        record: { retinopexy: { treatments: [{ modality: 'cryo', powerMilliwatts: 200 }] } },
      },
      {
        name: 'no application',
        fields: 'retinopexy.treatments.0.applications',
        record: { retinopexy: { treatments: [{ modality: 'endolaser', applications: 0 }] } },
      },
    ],
    silent: [
      {
        name: 'laser',
        record: {
          retinopexy: { treatments: [{ modality: 'endolaser', powerMilliwatts: 200, applications: 300 }] },
        },
      },
    ],
    unknown: [
      { name: 'kind not recorded', record: { retinopexy: { treatments: [{ powerMilliwatts: 200 }] } } },
    ],
  },
});
