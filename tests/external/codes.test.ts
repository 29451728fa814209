import { expect, it } from 'vitest';
import { codeSets } from '../../src/domain/coding/code-sets.ts';
import { proposeCodes } from '../../src/domain/coding/propose.ts';

it('ICD-10-CM (read): H33.0 and H33.3 tell the side in the sixth character, H33.4 and H33.2 in the fifth', () => {
  const code = (diagnosis: 'rhegmatogenous' | 'tractional', eye: 'right' | 'left') =>
    proposeCodes({
      version: 1,
      who: { eye },
      before: { diagnosis },
      breaks: { found: [{ kind: 'horseshoe' }] },
    }).proposed[0]?.code;
  expect(code('rhegmatogenous', 'right')).toBe('H33.011');
  expect(code('rhegmatogenous', 'left')).toBe('H33.012');
  expect(code('tractional', 'right')).toBe('H33.41');
  expect(code('tractional', 'left')).toBe('H33.42');
});

it('CPT (read): a vitrectomy for detachment is 67108 or 67113 and nothing else', () => {
  const { proposed } = proposeCodes({
    version: 1,
    before: { diagnosis: 'rhegmatogenous' },
    buckle: { elements: [{ role: 'encircling' }] },
    vitreous: { vitrectomy: true },
    tamponade: { agent: 'C3F8' },
    retinopexy: { treatments: [{ modality: 'endolaser', targets: 'all-breaks' }] },
  });
  expect(proposed.filter(({ set }) => set === 'CPT').map(({ code }) => code)).toEqual(['67108']);
});

it('marks what is from memory for the coder to confirm', () => {
  for (const { entries } of Object.values(codeSets)) {
    for (const { certainty } of Object.values(entries)) expect(['R', 'R2', 'M']).toContain(certainty);
  }
  const { proposed } = proposeCodes({ version: 1, who: { eye: 'left' }, vitreous: { vitrectomy: true } });
  expect(proposed.filter(({ set }) => set === 'OPCS-4').every(({ confirm }) => confirm)).toBe(true);
});
