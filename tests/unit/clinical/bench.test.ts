import { expect, it } from 'vitest';
import { falseAlarms } from '../../../scripts/bench/checker.ts';

// Numbers that the bench itself does not use.
const alarms = falseAlarms({ records: 2000, seed: 400_000 });
const worst = () =>
  alarms.offenders
    .slice(0, 5)
    .map((offender) => `${offender.count} × ${offender.rule}: ${offender.example.message}`);

it('stays silent on sound records: under 5 contradictions or omissions per thousand', () => {
  expect(alarms.falseFlags.contradiction + alarms.falseFlags.omission, worst().join('\n')).toBeLessThan(5);
});

it('is sparing on sound records: under 50 cautions per thousand', () => {
  expect(alarms.falseFlags.caution, worst().join('\n')).toBeLessThan(50);
});
