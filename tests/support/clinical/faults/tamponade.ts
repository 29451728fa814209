import { addDays, dateOf } from '../calendar.ts';
import { buckled, diluted, general, hasGas, hasLongGas, hasOil, inFamily, vitrectomized } from './fault.ts';

const { wrong, missing } = inFamily('tamponade');
type Subject = Parameters<typeof hasGas>[0];

const agent = (r: Subject) => r.tamponade?.agent;
const strength = (percent: number, r: Subject) => ({
  'tamponade.concentrationPercent': percent,
  'tamponade.pureMl': Math.round((r.tamponade?.syringeMl ?? 50) * percent) / 100,
});
const pneumatic = (r: Subject) => r.who?.performed?.includes('pneumatic-retinopexy') ?? false;
const procedures = (r: Subject, change: (names: string[]) => string[]) => ({
  'who.performed': change([...(r.who?.performed ?? [])]),
  'who.planned': change([...(r.who?.planned ?? [])]),
});

export const tamponadeFaults = [
  wrong(['strength-of-sf6-for-c3f8', 'caution', 'C3F8 at 30%'], (r) =>
    diluted(r) && agent(r) === 'C3F8' ? strength(30, r) : null,
  ),
  wrong(['sf6-at-half', 'caution', 'SF6 at 50% in a full eye'], (r) =>
    diluted(r) && agent(r) === 'SF6' ? strength(50, r) : null,
  ),
  wrong(['c2f6-at-a-third', 'caution', 'C2F6 at 35% in a full eye'], (r) =>
    diluted(r) && agent(r) === 'C2F6' ? strength(35, r) : null,
  ),
  wrong(['gas-too-weak', 'caution', 'C3F8 at 4%'], (r) =>
    diluted(r) && agent(r) === 'C3F8' ? strength(4, r) : null,
  ),
  wrong(['agent-exchanged-strength-kept', 'caution', 'C3F8 written for SF6, strength of SF6'], (r) =>
    diluted(r) && agent(r) === 'SF6' && r.tamponade?.concentrationPercent === 20
      ? { 'tamponade.agent': 'C3F8' }
      : null,
  ),
  wrong(['pure-gas-in-a-full-eye', 'contradiction', 'Pure gas fills the eye'], (r) =>
    hasLongGas(r) && diluted(r)
      ? {
          'tamponade.mixing': 'pure',
          'tamponade.concentrationPercent': 100,
          'tamponade.pureMl': undefined,
          'tamponade.syringeMl': undefined,
        }
      : null,
  ),
  wrong(['dilution-does-not-add-up', 'contradiction', 'Pure volume does not give that strength'], (r) =>
    diluted(r) && r.tamponade?.pureMl !== undefined
      ? { 'tamponade.pureMl': Math.round(r.tamponade.pureMl * 20) / 10 }
      : null,
  ),
  wrong(
    ['syringe-changed-pure-kept', 'contradiction', 'The syringe is another, the pure volume the same'],
    (r) => (diluted(r) && r.tamponade?.syringeMl === 50 ? { 'tamponade.syringeMl': 20 } : null),
  ),
  wrong(['more-pure-gas-than-syringe', 'contradiction', 'Pure volume and syringe changed over'], (r) =>
    diluted(r) && r.tamponade?.pureMl !== undefined
      ? { 'tamponade.pureMl': r.tamponade.syringeMl, 'tamponade.syringeMl': r.tamponade.pureMl }
      : null,
  ),
  wrong(['strength-as-a-fraction', 'contradiction', 'Strength written as 0.2 for 20%'], (r) =>
    diluted(r) && r.tamponade?.concentrationPercent === 20 ? { 'tamponade.concentrationPercent': 0.2 } : null,
  ),
  missing(
    ['strength-not-stated', 'omission', 'No strength of a diluted gas'],
    'tamponade.concentrationPercent',
    diluted,
  ),
  missing(
    ['pure-or-diluted', 'omission', 'Not said whether pure or diluted'],
    'tamponade.mixing',
    hasLongGas,
  ),
  wrong(['diluted-at-a-hundred', 'contradiction', 'Diluted, at 100%'], (r) =>
    diluted(r)
      ? {
          'tamponade.concentrationPercent': 100,
          'tamponade.pureMl': undefined,
          'tamponade.syringeMl': undefined,
        }
      : null,
  ),
  wrong(
    ['bubble-of-five-in-a-pneumatic', 'contradiction', 'Pneumatic retinopexy with 5 mL of pure gas'],
    (r) => (pneumatic(r) && hasLongGas(r) ? { 'tamponade.volumeMl': 5 } : null),
  ),
  wrong(['point-lost-in-a-pneumatic', 'contradiction', 'Three millilitres for 0.3'], (r) =>
    pneumatic(r) && agent(r) === 'C3F8' ? { 'tamponade.volumeMl': 3 } : null,
  ),
  wrong(['bubble-too-small-to-matter', 'caution', 'Pneumatic retinopexy with 0.05 mL'], (r) =>
    pneumatic(r) ? { 'tamponade.volumeMl': 0.05, 'tamponade.fillPercent': undefined } : null,
  ),
  wrong(
    ['pneumatic-of-an-inferior-break', 'caution', 'Pneumatic retinopexy for a break at 6 o’clock'],
    (r) => {
      if (!pneumatic(r) || !Array.isArray(r.breaks?.found) || r.breaks.found.length !== 1) return null;
      const nasal = r.breaks.found[0]?.quadrant?.includes('nasal') ?? false;
      return {
        'breaks.found.0.clock': 6,
        'breaks.found.0.quadrant': nasal ? 'inferonasal' : 'inferotemporal',
        'before.detachmentFromClock': 4.5,
        'before.detachmentToClock': 7.5,
        'before.quadrantsDetached': 2,
      };
    },
  ),
  wrong(['air-with-a-strength', 'contradiction', 'Air at 20%'], (r) =>
    agent(r) === 'air' ? { 'tamponade.concentrationPercent': 20, 'tamponade.mixing': 'diluted' } : null,
  ),
  wrong(['oil-with-a-strength', 'contradiction', 'Oil at 14%'], (r) =>
    hasOil(r) ? { 'tamponade.concentrationPercent': 14 } : null,
  ),
  missing(
    ['viscosity-not-stated', 'omission', 'Oil without its viscosity'],
    'tamponade.viscosityCentistokes',
    hasOil,
  ),
  wrong(['viscosity-without-its-noughts', 'caution', 'Oil of 10 centistokes'], (r) =>
    hasOil(r) ? { 'tamponade.viscosityCentistokes': 10 } : null,
  ),
  wrong(['gas-with-a-viscosity', 'contradiction', 'A gas of 5,000 centistokes'], (r) =>
    hasLongGas(r) ? { 'tamponade.viscosityCentistokes': 5000 } : null,
  ),
  wrong(['aphakic-oil-without-iridectomy', 'caution', 'Oil in an aphakic eye, no iridectomy'], (r) =>
    hasOil(r) && r.before?.lens === 'aphakic' ? { 'tamponade.iridectomy': 'none' } : null,
  ),
  wrong(
    ['iridectomy-at-the-wrong-end', 'contradiction', 'Iridectomy above for light oil, or below for heavy'],
    (r) =>
      hasOil(r) && r.before?.lens === 'aphakic'
        ? { 'tamponade.iridectomy': agent(r) === 'heavy-oil' ? 'inferior' : 'superior' }
        : null,
  ),
  wrong(['gas-listed-none-given', 'contradiction', 'Gas among the procedures, agent none'], (r) =>
    buckled(r) && !vitrectomized(r) && agent(r) === 'none'
      ? procedures(r, (names) => [...names, 'gas'])
      : null,
  ),
  wrong(['gas-given-not-listed', 'contradiction', 'A long gas given, not among the procedures'], (r) =>
    hasLongGas(r) && !pneumatic(r) ? procedures(r, (names) => names.filter((n) => n !== 'gas')) : null,
  ),
  wrong(['gas-listed-oil-given', 'contradiction', 'Gas among the procedures, oil in the eye'], (r) =>
    hasOil(r) ? procedures(r, (names) => names.map((n) => (n === 'oil' ? 'gas' : n))) : null,
  ),
  wrong(['gas-and-oil-listed', 'contradiction', 'Gas and oil are both among the procedures'], (r) =>
    hasOil(r) && r.who?.whyChanged === undefined ? procedures(r, (names) => [...names, 'gas']) : null,
  ),
  missing(['agent-left-blank', 'omission', 'What fills the eye is left blank'], 'tamponade.agent'),
  missing(
    ['fill-not-stated', 'omission', 'How full the eye is left is not said'],
    'tamponade.fillPercent',
    (r) => vitrectomized(r) && (hasOil(r) || hasLongGas(r)),
  ),
  missing(
    ['exchange-not-stated', 'omission', 'How it was put in is not said'],
    'tamponade.exchange',
    (r) => hasOil(r) || hasLongGas(r),
  ),
  wrong(['oil-by-a-gas-exchange', 'contradiction', 'Oil put in by an exchange of gas for air'], (r) =>
    hasOil(r) ? { 'tamponade.exchange': 'air-gas' } : null,
  ),
  wrong(['gas-by-an-oil-exchange', 'contradiction', 'Gas put in by a fluid and oil exchange'], (r) =>
    hasLongGas(r) && vitrectomized(r) ? { 'tamponade.exchange': 'fluid-oil' } : null,
  ),
  wrong(['more-than-the-eye-holds', 'contradiction', '18 mL in one eye'], (r) =>
    hasOil(r) ? { 'tamponade.volumeMl': 18 } : null,
  ),
  wrong(['volume-against-fill', 'contradiction', 'Full eye with half a millilitre of oil'], (r) =>
    hasOil(r) ? { 'tamponade.volumeMl': 0.5 } : null,
  ),
  wrong(['exchange-that-left-a-third', 'caution', 'An exchange of the whole eye that fills 20%'], (r) =>
    diluted(r) ? { 'tamponade.fillPercent': 20, 'tamponade.volumeMl': undefined } : null,
  ),
  wrong(
    ['nitrous-oxide-never-stopped', 'contradiction', 'Nitrous oxide used and not stopped before gas'],
    (r) =>
      general(r) && hasGas(r)
        ? { 'anaesthesia.nitrousOxideUsed': true, 'anaesthesia.nitrousOxideStoppedAt': 'not-applicable' }
        : null,
  ),
  wrong(['nitrous-oxide-stop-not-timed', 'omission', 'Nitrous oxide with gas, no time of stopping'], (r) =>
    general(r) && hasGas(r)
      ? { 'anaesthesia.nitrousOxideUsed': true, 'anaesthesia.nitrousOxideStoppedAt': undefined }
      : null,
  ),
  wrong(
    ['nitrous-oxide-under-a-block', 'caution', 'Nitrous oxide in an operation under topical drops'],
    (r) =>
      r.anaesthesia?.kind === 'topical' && hasGas(r)
        ? { 'anaesthesia.nitrousOxideUsed': true, 'anaesthesia.nitrousOxideStoppedAt': 'not-applicable' }
        : null,
  ),
  missing(
    ['nitrous-oxide-not-stated', 'omission', 'General anaesthesia and gas; nothing said of nitrous oxide'],
    'anaesthesia.nitrousOxideUsed',
    (r) => general(r) && hasGas(r),
  ),
  wrong(
    ['paracentesis-of-two-millilitres', 'contradiction', 'A paracentesis larger than the anterior chamber'],
    (r) =>
      r.tamponade?.paracentesisVolumeMl === undefined ? null : { 'tamponade.paracentesisVolumeMl': 2.5 },
  ),
  wrong(
    ['volume-of-a-paracentesis-not-made', 'contradiction', 'A volume of a paracentesis that was not made'],
    (r) => (r.tamponade?.paracentesis === false ? { 'tamponade.paracentesisVolumeMl': 0.3 } : null),
  ),
  wrong(['fluid-put-in-the-eye-when-none', 'contradiction', 'No agent, yet 4.5 mL put in'], (r) =>
    agent(r) === 'none' ? { 'tamponade.volumeMl': 4.5, 'tamponade.fillPercent': 95 } : null,
  ),
  wrong(['oil-out-of-date', 'contradiction', 'The oil had expired'], (r) =>
    hasOil(r) ? { 'tamponade.expiresOn': addDays(dateOf(r.who?.startedAt ?? ''), -15) } : null,
  ),
  wrong(
    ['pneumatic-listed-with-vitrectomy', 'contradiction', 'Pneumatic retinopexy listed beside vitrectomy'],
    (r) =>
      vitrectomized(r) && hasGas(r) ? procedures(r, (names) => [...names, 'pneumatic-retinopexy']) : null,
  ),
];
