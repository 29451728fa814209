import { defineRule } from '../../define-rule.ts';
import { capital, labelOf, numberWords, treatmentsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'retinopexy-settings-unusual',
  family: 'retinopexy',
  level: 'caution',
  title: 'Retinopexy with an unusual number, power or duration',
  why: 'A nought too many is the usual cause; heavy treatment is said to feed PVR.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: (record) =>
    treatmentsOf(record).flatMap(
      ({ modality, powerMilliwatts, durationMilliseconds, applications }, index) => {
        if (modality === undefined) return [];
        const laser = modality.includes('laser');
        const unusual = [
          { field: 'powerMilliwatts', value: powerMilliwatts, most: 1500, unit: 'mW' },
          { field: 'durationMilliseconds', value: durationMilliseconds, most: 1000, unit: 'ms' },
          { field: 'applications', value: applications, most: laser ? 3500 : 80, unit: 'applications' },
        ].find(
          ({ value, most, field }) =>
            value !== undefined && value > most && (laser || field === 'applications'),
        );
        if (unusual === undefined) return [];
        return [
          {
            fields: [`retinopexy.treatments.${index}.${unusual.field}`],
            message: `${capital(labelOf('retinopexy.treatments.modality', modality))} is recorded with ${numberWords(unusual.value ?? 0)} ${unusual.unit}.`,
          },
        ];
      },
    ),
  examples: {
    fires: [
      {
        name: '3,000 mW',
        fields: 'retinopexy.treatments.0.powerMilliwatts',
        record: { retinopexy: { treatments: [{ modality: 'endolaser', powerMilliwatts: 3000 }] } },
      },
    ],
    silent: [
      {
        name: '360° laser',
        record: {
          retinopexy: {
            treatments: [
              {
                modality: 'endolaser',
                targets: 'circumferential',
                powerMilliwatts: 200,
                durationMilliseconds: 200,
                applications: 1400,
              },
            ],
          },
        },
      },
    ],
    unknown: [
      { name: 'kind not recorded', record: { retinopexy: { treatments: [{ powerMilliwatts: 3000 }] } } },
    ],
  },
});
