import {
  AlignmentType,
  BorderStyle,
  Footer,
  Header,
  HeadingLevel,
  type ISectionOptions,
  PageNumber,
  Paragraph,
  Table,
  TableCell,
  TableRow,
  TextRun,
  WidthType,
} from 'docx';
import type { UnitView } from '../../domain/api.ts';
import type { DraftedTable, Sheet } from '../../domain/drafting/sheet.ts';
import { dateWords } from '../../domain/drafting/words.ts';
import type { CaseRecord } from '../../domain/record/schema.ts';

const INK = '22252B';
const SOFT = '5A5447';
const RULE = 'B9AE98';

export const styles = {
  default: {
    document: {
      run: { font: 'Merriweather', size: 20, color: INK, language: { value: 'en-GB' } },
      paragraph: { spacing: { after: 100, line: 290 } },
    },
    title: {
      run: { font: 'Merriweather', size: 32, bold: true, color: INK },
      paragraph: { spacing: { before: 120, after: 160 } },
    },
    heading1: {
      run: { font: 'Merriweather', size: 23, bold: true, color: INK },
      paragraph: { spacing: { before: 200, after: 60 }, keepNext: true },
    },
  },
} as const;

const page = {
  size: { width: 11906, height: 16838 },
  margin: { top: 1100, bottom: 1000, left: 1250, right: 1250 },
} as const;

const none = { style: BorderStyle.NONE, size: 0, color: 'FFFFFF' } as const;
const line = { style: BorderStyle.SINGLE, size: 4, color: RULE } as const;
const noBorders = {
  top: none,
  bottom: none,
  left: none,
  right: none,
  insideHorizontal: none,
  insideVertical: none,
} as const;

const soft = (text: string) => new TextRun({ text, color: SOFT, size: 17 });

/** A word so long that no line holds it is given places to break. */
const breakable = (text: string): string => text.replace(/\S{40}(?=\S)/g, '$&\u200b');

export const plain = (text: string): Paragraph =>
  new Paragraph({ text: breakable(text), widowControl: true });

export const heading = (text: string): Paragraph => new Paragraph({ text, heading: HeadingLevel.HEADING_1 });

export const title = (text: string): Paragraph => new Paragraph({ text, heading: HeadingLevel.TITLE });

const WIDTH = 9400;

const row = (cells: readonly string[], widths: readonly number[], isHead: boolean) =>
  new TableRow({
    tableHeader: isHead,
    cantSplit: true,
    children: cells.map(
      (text, index) =>
        new TableCell({
          width: { size: widths[index] ?? 1000, type: WidthType.DXA },
          margins: { top: 50, bottom: 50, left: 90, right: 90 },
          children: [
            new Paragraph({
              spacing: { after: 0 },
              children: [new TextRun({ text: breakable(text), bold: isHead, size: 18 })],
            }),
          ],
        }),
    ),
  });

/** A table under its heading; the header row comes again on each page. */
export const table = ({ heading: words, columns, rows }: DraftedTable): (Paragraph | Table)[] => {
  const widths = columns.map(() => Math.floor(WIDTH / columns.length));
  return [
    heading(words),
    new Table({
      width: { size: WIDTH, type: WidthType.DXA },
      columnWidths: widths,
      borders: {
        top: line,
        bottom: line,
        left: none,
        right: none,
        insideHorizontal: line,
        insideVertical: none,
      },
      rows: [row(columns, widths, true), ...rows.map((cells) => row(cells, widths, false))],
    }),
  ];
};

/** Letterhead: the unit at the left, how to reach it at the right, a rule below. */
export const letterhead = (unit: UnitView): Table => {
  const half = WIDTH / 2;
  const cell = (
    lines: readonly (readonly [string, boolean])[],
    alignment: (typeof AlignmentType)[keyof typeof AlignmentType],
  ) =>
    new TableCell({
      width: { size: half, type: WidthType.DXA },
      children: lines.map(
        ([text, strong]) =>
          new Paragraph({
            alignment,
            spacing: { after: 0 },
            children: [
              new TextRun({
                text: breakable(text),
                bold: strong,
                size: strong ? 24 : 17,
                color: strong ? INK : SOFT,
              }),
            ],
          }),
      ),
    });
  const name = unit.demonstration ? `${unit.name} (demonstration)` : unit.name;
  return new Table({
    width: { size: WIDTH, type: WidthType.DXA },
    columnWidths: [half, half],
    borders: { ...noBorders, bottom: { ...line, color: INK } },
    rows: [
      new TableRow({
        children: [
          cell(
            [
              [name, true],
              [unit.service, false],
            ],
            AlignmentType.LEFT,
          ),
          cell(
            [
              [unit.address, false],
              [unit.telephone, false],
              [unit.email, false],
            ],
            AlignmentType.RIGHT,
          ),
        ],
      }),
    ],
  });
};

export const patientName = (record: CaseRecord): string => {
  const patient = record.who?.patient;
  return [patient?.familyName, patient?.givenName].filter((part) => part !== undefined).join(', ');
};

/** Who the document is about: name, born, number, eye, operation. */
export const patientBlock = (record: CaseRecord): Table => {
  const { patient, eye, startedAt } = record.who ?? {};
  const allergies = patient?.allergies;
  const items = [
    ['Patient', patientName(record)],
    ['Born', patient?.dateOfBirth === undefined ? '' : dateWords(patient.dateOfBirth)],
    ['Record number', patient?.number ?? ''],
    ['Eye', eye === undefined ? '' : `${eye.toUpperCase()} EYE`],
    ['Operated on', startedAt === undefined ? '' : dateWords(startedAt)],
    [
      'Allergies',
      allergies === undefined
        ? ''
        : allergies === 'none'
          ? 'none known'
          : allergies.map(({ substance }) => substance ?? '').join(', '),
    ],
  ].filter(([, value]) => value !== '');
  return new Table({
    width: { size: WIDTH, type: WidthType.DXA },
    columnWidths: [1900, WIDTH - 1900],
    borders: noBorders,
    rows: items.map(
      ([name = '', value = '']) =>
        new TableRow({
          children: [
            new TableCell({
              width: { size: 1900, type: WidthType.DXA },
              children: [new Paragraph({ spacing: { after: 0 }, children: [soft(name)] })],
            }),
            new TableCell({
              width: { size: WIDTH - 1900, type: WidthType.DXA },
              children: [
                new Paragraph({
                  spacing: { after: 0 },
                  children: [
                    new TextRun({
                      text: breakable(value),
                      bold: name === 'Patient' || name === 'Eye',
                      size: 19,
                    }),
                  ],
                }),
              ],
            }),
          ],
        }),
    ),
  });
};

/** The words of a sheet: a heading and a paragraph for each section; `bare` sections go without their heading. */
export const sheetWords = (sheet: Sheet, bare: readonly string[] = []): Paragraph[] =>
  sheet.sections.flatMap((section) => {
    const words = section.statements.filter(({ origin }) => origin !== 'deleted').map(({ text }) => text);
    if (words.length === 0) return [];
    const isBare = bare.includes(section.id);
    return [
      ...(isBare ? [] : [heading(section.heading)]),
      ...(isBare ? words.map(plain) : [plain(words.join(' '))]),
    ];
  });

interface Running {
  record: CaseRecord;
  unit: UnitView;
  version: string;
  /** Printed large at the head of each page: "DRAFT – not signed". */
  warning?: string;
}

/** A section of the document with its header and its footer: patient, version and page on every page. */
export const section = (
  children: ISectionOptions['children'],
  { record, unit, version, warning }: Running,
): ISectionOptions => {
  const heads = [warning, unit.demonstration ? 'DEMONSTRATION: invented patient' : undefined].filter(
    (one) => one !== undefined,
  );
  const number = record.who?.patient?.number;
  return {
    properties: { page },
    headers: {
      default: new Header({
        children: heads.map(
          (text) =>
            new Paragraph({
              alignment: AlignmentType.RIGHT,
              spacing: { after: 0 },
              children: [new TextRun({ text, bold: true, size: 17 })],
            }),
        ),
      }),
    },
    footers: {
      default: new Footer({
        children: [
          new Paragraph({
            border: { top: { ...line, space: 4 } },
            alignment: AlignmentType.CENTER,
            children: [
              soft(
                [number === undefined ? '' : `Record number ${number}`, version]
                  .filter((part) => part !== '')
                  .join(' · '),
              ),
              new TextRun({
                children: [' · page ', PageNumber.CURRENT, ' of ', PageNumber.TOTAL_PAGES],
                color: SOFT,
                size: 17,
              }),
            ],
          }),
        ],
      }),
    },
    children,
  };
};
