import { choice, clockHour, count, date, group, orNotApplicable, quantity, text, yesNo } from '../fields.ts';

export const tamponade = group('Tamponade', {
  agent: choice('Agent', {
    none: 'none',
    air: 'air',
    SF6: 'sulphur hexafluoride (SF6)',
    C2F6: 'hexafluoroethane (C2F6)',
    C3F8: 'octafluoropropane (C3F8)',
    'silicone-oil': 'silicone oil',
    'heavy-oil': 'heavy silicone oil',
  }),
  viscosityCentistokes: orNotApplicable(count('Viscosity', 20000, 'cSt')),
  mixing: orNotApplicable(choice('Given', { pure: 'pure', diluted: 'diluted with air' })),
  concentrationPercent: orNotApplicable(quantity('Concentration', '%', 0, 100)),
  pureMl: quantity('Pure gas', 'mL', 0, 100),
  syringeMl: quantity('in syringe of', 'mL', 0, 200),
  volumeMl: quantity('Volume put in', 'mL', 0, 20),
  fillPercent: quantity('Fill', '% of the cavity', 0, 100),
  exchange: choice('Put in by', {
    'fluid-air-gas': 'fluid–air exchange, then gas for air',
    'air-gas': 'gas for air',
    'fluid-oil': 'fluid–oil exchange',
    'air-oil': 'air–oil exchange',
    'heavy-liquid-oil': 'direct exchange of heavy liquid for oil',
    injection: 'injection',
  }),
  lot: text('Lot'),
  expiresOn: date('Expiry'),
  paracentesis: yesNo('Paracentesis'),
  paracentesisVolumeMl: quantity('Paracentesis volume', 'mL', 0, 3),
  iridectomy: choice('Peripheral iridectomy', {
    none: 'none',
    inferior: 'inferior',
    superior: 'superior',
    present: 'already there',
  }),
  injectedAtClock: clockHour('Injected at'),
});
