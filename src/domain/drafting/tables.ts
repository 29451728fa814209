import type { CaseRecord } from '../record/schema.ts';
import type { DraftedTable } from './sheet.ts';
import { clockWords, dateWords, labelOf, numberWords } from './words.ts';

const cell = (value: string | undefined): string => value ?? '–';

/** The breaks, one a row; from two on, where a table reads better than sentences. */
export const breaksTable = (record: CaseRecord): DraftedTable | undefined => {
  const found = record.breaks?.found;
  if (!Array.isArray(found) || found.length < 2) return undefined;
  return {
    id: 'breaks',
    heading: 'Breaks',
    columns: ['No.', 'Kind', 'Clock hour', 'Behind the limbus', 'Treated by', 'On element'],
    rows: found.map((one, index) => [
      String(index + 1),
      cell(one.kind === undefined ? undefined : labelOf('breaks.found.kind', one.kind)),
      cell(one.clock === undefined ? undefined : clockWords(one.clock)),
      cell(
        one.frontEdgeMm === undefined
          ? one.zone === undefined
            ? undefined
            : labelOf('breaks.found.zone', one.zone)
          : `${numberWords(one.frontEdgeMm)}${one.backEdgeMm === undefined ? '' : ` to ${numberWords(one.backEdgeMm)}`} mm`,
      ),
      cell(one.treatedBy?.map((value) => labelOf('breaks.found.treatedBy', value)).join(', ')),
      cell(one.supportedByElements === 'none' ? 'none' : one.supportedByElements?.join(', ')),
    ]),
    reads: ['breaks.found'],
  };
};

/** Everything that stays in the eye or on it, with lot and expiry. */
export const implantsTable = (record: CaseRecord): DraftedTable | undefined => {
  const elements = record.buckle?.elements;
  const lens = record.vitreous?.lensImplant;
  const expiry = (on: string | undefined) => cell(on === undefined ? undefined : dateWords(on));
  const rows: string[][] = [];
  if (Array.isArray(elements)) {
    for (const {
      form,
      material,
      widthMm,
      thicknessMm,
      lengthMm,
      catalogueNumber,
      lot,
      expiresOn,
    } of elements) {
      const kind = [
        material === undefined || form?.endsWith('sponge') === true
          ? ''
          : labelOf('buckle.elements.material', material),
        form === undefined ? 'element' : labelOf('buckle.elements.form', form),
      ];
      const sizes = [widthMm, thicknessMm, lengthMm].filter((mm) => mm !== undefined).map(numberWords);
      rows.push([
        kind.filter((part) => part !== '').join(' '),
        cell(sizes.length === 0 ? undefined : `${sizes.join(' × ')} mm`),
        cell(catalogueNumber),
        cell(lot),
        expiry(expiresOn),
      ]);
    }
  }
  if (typeof lens === 'object') {
    const power = lens.powerDioptres === undefined ? undefined : `${numberWords(lens.powerDioptres)} D`;
    rows.push([
      `lens implant${lens.form === undefined ? '' : `, ${lens.form}`}`,
      cell(power),
      '–',
      cell(lens.lot),
      expiry(lens.expiresOn),
    ]);
  }
  if (rows.length === 0) return undefined;
  const columns = ['Implant', 'Size', 'Catalogue number', 'Lot', 'Expiry'];
  return {
    id: 'implants',
    heading: 'Implants',
    columns,
    rows,
    reads: ['buckle.elements', 'vitreous.lensImplant'],
  };
};
