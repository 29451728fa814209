import { gasFacts, spanDays } from '../../../physics/gas.ts';
import { defineRule } from '../../define-rule.ts';
import { dateWords, daysBetween, gasOf, numberIn, operatedOn } from '../../facts.ts';

export const rule = defineRule({
  id: 'flying-before-gas-gone',
  family: 'aftercare',
  level: 'contradiction',
  title: 'A date for flying before the gas can have gone',
  why: 'At cabin pressure 1.00 mL of gas becomes 1.35 mL.',
  source: { text: 'Published half-lives and spans of the gases; 760/564 by Boyle', certainty: 'R' },
  answerable: false,
  check: (record) => {
    const gas = gasOf(record);
    const on = operatedOn(record);
    const until = record.aftercare?.noFlyingUntil;
    if (gas === undefined || on === undefined || until === undefined || until === 'surgeon-confirms')
      return [];
    const percent =
      record.tamponade?.mixing === 'pure'
        ? 100
        : (numberIn(record.tamponade?.concentrationPercent) ?? gasFacts[gas].isoexpansile.usual);
    const { low, high } = spanDays(gas, percent, record.before?.lens === 'aphakic' ? 'aphakic' : 'phakic');
    const days = daysBetween(on, until);
    if (days >= Math.ceil(low)) return [];
    const message = `Flying is ruled out until ${dateWords(until)}, ${days} days after surgery; ${gas} may last ${Math.round(low)} to ${Math.round(high)} days or longer (an estimate).`;
    return [{ fields: ['aftercare.noFlyingUntil', 'tamponade.agent'], message }];
  },
  examples: {
    fires: [
      {
        name: 'C3F8, two weeks',
        fields: 'aftercare.noFlyingUntil',
        record: {
          who: { startedAt: '2026-12-01T10:00' },
          tamponade: { agent: 'C3F8', concentrationPercent: 14 },
          aftercare: { noFlyingUntil: '2026-12-15' },
        },
      },
    ],
    silent: [
      {
        name: 'until the surgeon confirms',
        record: {
          who: { startedAt: '2026-12-01T10:00' },
          tamponade: { agent: 'C3F8' },
          aftercare: { noFlyingUntil: 'surgeon-confirms' },
        },
      },
    ],
    unknown: [
      {
        name: 'no date of operation',
        record: { tamponade: { agent: 'C3F8' }, aftercare: { noFlyingUntil: '2026-12-15' } },
      },
    ],
  },
});
