import { labelOf } from '../drafting/words.ts';
import type { CaseRecord } from '../record/schema.ts';
import { dropsOf, medicinesOf, tabletsOf } from './facts.ts';

interface Given {
  drug: string;
  field: string;
  verb: 'given' | 'used' | 'prescribed';
}

const listed = <T>(list: readonly T[] | string | undefined): readonly T[] =>
  Array.isArray(list) ? list : [];

/** Every medicine, antiseptic and dye that a record names, in the order of the operation. */
export const givenIn = (record: CaseRecord): Given[] => {
  const { agents, antisepsis } = record.anaesthesia ?? {};
  const named = [
    ...listed(agents).map(({ drug }, index) => ({
      drug,
      field: `anaesthesia.agents.${index}.drug`,
      verb: 'given' as const,
    })),
    {
      drug: antisepsis === 'none' ? undefined : antisepsis,
      field: 'anaesthesia.antisepsis',
      verb: 'used' as const,
    },
    ...listed(record.vitreous?.dyes).map(({ kind }, index) => ({
      drug: kind === undefined ? undefined : labelOf('vitreous.dyes.kind', kind),
      field: `vitreous.dyes.${index}.kind`,
      verb: 'used' as const,
    })),
    ...medicinesOf(record).map(({ drug }, index) => ({
      drug,
      field: `endOfCase.medicines.${index}.drug`,
      verb: 'given' as const,
    })),
    ...dropsOf(record).map(({ drug }, index) => ({
      drug,
      field: `aftercare.drops.${index}.drug`,
      verb: 'prescribed' as const,
    })),
    ...tabletsOf(record).map(({ drug }, index) => ({
      drug,
      field: `aftercare.tablets.${index}.drug`,
      verb: 'prescribed' as const,
    })),
  ];
  return named.flatMap(({ drug, ...rest }) => (drug === undefined ? [] : [{ drug, ...rest }]));
};

/** Classes in which an allergy to one is taken for all (common practice). */
const classes: readonly RegExp[] = [
  /penicillin|cillin\b|co-amoxiclav|augmentin/,
  /cephalosporin|\bcef\w+|\bceph\w+/,
  /iodine|povidone/,
  /chlorhexidine/,
  /aminoglycoside|gentamicin|neomycin|tobramycin|amikacin|framycetin/,
  /quinolone|floxacin/,
  /\bsulfa\b|\bsulpha\b|sul(?:f|ph)onamide|sul(?:f|ph)acetamide|sul(?:f|ph)ameth|co-trimoxazole/,
  /nsaid|non-steroidal/,
];

const antiInflammatory =
  /nsaid|non-steroidal|aspirin|acetylsalicyl|ibuprofen|naproxen|ketorolac|diclofenac|bromfenac|nepafenac/;

/** What is chemically related to what; few react to both. */
const relatives: readonly (readonly [RegExp, RegExp])[] = [
  [/\bsulfa\b|\bsulpha\b|sul(?:f|ph)onamide|co-trimoxazole/, /acetazolamide|dorzolamide|brinzolamide/],
  [antiInflammatory, antiInflammatory],
  [/iodine|iodide|contrast/, /indocyanine/],
];

/** Whether a drug is the substance of an allergy or one of its class. Contrast media are not antiseptics. */
export const isSameMedicine = (allergy: string, drug: string): boolean => {
  const substance = allergy.trim().toLowerCase();
  const name = drug.toLowerCase();
  if (/contrast/.test(substance)) return false;
  if (substance.length >= 4 && name.includes(substance)) return true;
  return classes.some((one) => one.test(substance) && one.test(name));
};

/** Whether a drug is related to the substance of an allergy. */
export const isRelatedMedicine = (allergy: string, drug: string): boolean =>
  relatives.some(([of, other]) => of.test(allergy.toLowerCase()) && other.test(drug.toLowerCase()));
