import { cavityMl } from '../bubble.ts';
import type { Figure } from '../figure.ts';
import {
  expansionOf,
  gasFacts,
  halfLifeDays,
  isGas,
  percentOf,
  pressures,
  pureMl,
  spanDays,
  volumeAtPressure,
} from '../gas.ts';
import { type Ground, round } from './ground.ts';

const GAS_ALERT = 'Royal College of Ophthalmologists safety alert, 18 December 2018 (read)';

/** Dilution, growth, span and altitude of the gas. */
export const gasFigures = ({ record, globe, assumed }: Ground): Figure[] => {
  const tamponade = record.tamponade;
  const gas = tamponade?.agent;
  if (!isGas(gas) || tamponade === undefined) return [];
  const figures: Figure[] = [];
  const recorded =
    typeof tamponade.concentrationPercent === 'number' ? tamponade.concentrationPercent : undefined;
  const percent = tamponade.mixing === 'pure' ? 100 : (recorded ?? gasFacts[gas].isoexpansile.usual);
  const guessed =
    recorded === undefined && tamponade.mixing !== 'pure' && gas !== 'air' ? [`${percent}%`] : [];
  const lens = record.before?.lens === 'aphakic' ? 'aphakic' : 'phakic';
  const { syringeMl, pureMl: pure, volumeMl, fillPercent } = tamponade;
  if (syringeMl !== undefined && recorded !== undefined && gas !== 'air') {
    figures.push({
      id: 'gas-dilution-pure-ml',
      name: 'Pure gas to draw up',
      value: round(pureMl(syringeMl, recorded), 2),
      unit: 'mL',
      formula: 'syringe mL × %',
      inputs: { syringeMl, percent: recorded },
      assumed: [],
      source: 'Computed',
      fields: ['tamponade.pureMl'],
      sentence: `${recorded}% in ${syringeMl} mL is ${round(pureMl(syringeMl, recorded), 2)} mL of pure gas.`,
    });
  }
  if (syringeMl !== undefined && pure !== undefined && syringeMl > 0 && gas !== 'air') {
    figures.push({
      id: 'gas-dilution-percent',
      name: 'Concentration made',
      value: round(percentOf(pure, syringeMl)),
      unit: '%',
      formula: 'pure mL / syringe mL',
      inputs: { syringeMl, pureMl: pure },
      assumed: [],
      source: 'Computed',
      fields: ['tamponade.concentrationPercent'],
      sentence: `${pure} mL in ${syringeMl} mL makes ${round(percentOf(pure, syringeMl))}%.`,
    });
  }
  const span = spanDays(gas, percent, lens);
  const half = halfLifeDays(gas, percent, lens);
  figures.push(
    {
      id: 'gas-half-life',
      name: 'Half-life of the gas',
      low: round(half.low),
      high: round(half.high),
      unit: 'days',
      formula: 'published half-lives around this concentration',
      inputs: { gas, percent, lens },
      assumed: guessed,
      source: 'Thompson, Arch Ophthalmol 1989;107:687 and 1992;110:1594 (read)',
      fields: ['tamponade.concentrationPercent'],
      sentence: `Half-life about ${half.low === half.high ? round(half.low) : `${round(half.low)} to ${round(half.high)}`} days (an estimate).`,
    },
    {
      id: 'gas-span',
      name: 'How long the gas may last',
      low: Math.round(span.low),
      high: Math.round(span.high),
      unit: 'days',
      formula: 't½·log2(10) to t½·log2(100), and the published span',
      inputs: { gas, percent, lens },
      assumed: guessed,
      source: `${GAS_ALERT}; Thompson 1989, 1992 (read)`,
      fields: ['tamponade.agent'],
      sentence: `May last about ${Math.round(span.low)} to ${Math.round(span.high)} days or longer (an estimate); only an examination shows that it has gone.`,
    },
    {
      id: 'gas-expansion',
      name: 'Growth of the gas in the eye',
      value: round(expansionOf(gas, percent), 2),
      unit: 'times',
      formula: '1 + (pure expansion − 1)·(% − isoexpansile)/(100 − isoexpansile), not below 1',
      inputs: { gas, percent },
      assumed: guessed,
      source: `${GAS_ALERT}; in between a straight line (computed)`,
      fields: ['tamponade.concentrationPercent'],
      sentence:
        expansionOf(gas, percent) > 1.05
          ? `Grows to about ${round(expansionOf(gas, percent), 1)} times (an estimate).`
          : 'Does not grow at this concentration (an estimate).',
    },
  );
  const put =
    volumeMl ??
    (fillPercent === undefined ? undefined : (cavityMl(globe.cavityRadiusMm) * fillPercent) / 100);
  if (put !== undefined) {
    const high = volumeAtPressure(put, pressures.cabinMmHg);
    figures.push({
      id: 'altitude-volume',
      name: 'Volume at cabin pressure if the eye could stretch',
      value: round(high, 2),
      unit: 'mL',
      formula: 'V·760/564 (Boyle)',
      inputs: { volumeMl: round(put, 2), pressureMmHg: pressures.cabinMmHg },
      assumed: volumeMl === undefined ? assumed : [],
      source: 'Cabin about 8,000 ft, 564 mmHg (computed)',
      fields: ['tamponade.volumeMl'],
      sentence: `${round(put, 1)} mL would become about ${round(high, 1)} mL in an aircraft cabin (an estimate): no flying with gas.`,
    });
  }
  return figures;
};
