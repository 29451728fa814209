import { execFileSync } from 'node:child_process';
import { mkdtempSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import JSZip from 'jszip';
import mammoth from 'mammoth';
import { describe, expect, it } from 'vitest';
import { draftNote } from '../../../src/domain/drafting/draft.ts';
import { mergeSheet } from '../../../src/domain/drafting/merge.ts';
import { draftLetter } from '../../../src/domain/letters/letters.ts';
import type { FrozenNote } from '../../../src/domain/signing/frozen.ts';
import { letterDocx } from '../../../src/server/documents/letter-docx.ts';
import { noteDocx } from '../../../src/server/documents/note-docx.ts';
import { cleanRecord } from '../../support/clinical/generate.ts';

const unit = {
  name: 'Larkfield Eye Unit',
  service: 'Retinal service',
  address: '1 Meadow Lane, Larkfield',
  telephone: '01632 960000',
  email: 'unit@example.org',
  demonstration: true,
};

const noteOf = (familyName: string): FrozenNote => {
  const clean = cleanRecord(2);
  const record = { ...clean, who: { ...clean.who, patient: { ...clean.who?.patient, familyName } } };
  return {
    format: 'buckram-signed-note-1',
    caseId: 'one',
    version: 1,
    record,
    sheet: mergeSheet(null, draftNote(record)),
    flags: [],
    answers: [],
    unit,
    settings: {},
    versions: { record: 1, templates: 'x', rules: 'y' },
    signature: {
      name: 'A. Surgeon',
      title: 'Consultant vitreoretinal surgeon',
      meaning: 'I performed this operation and this note is my account of it',
      at: '2026-12-01T10:42:00.000Z',
      zone: 'Europe/London',
    },
  };
};

const seal = { sha256: 'ab'.repeat(32), code: 'ABC-DEF-GHJ-KLM' };
const words = async (docx: Uint8Array) => (await mammoth.extractRawText({ buffer: Buffer.from(docx) })).value;

/** The pages of a document as LibreOffice prints them. */
const printed = (docx: Uint8Array): string[] => {
  const folder = mkdtempSync(join(tmpdir(), 'buckram-print-'));
  writeFileSync(join(folder, 'one.docx'), docx);
  const profile = `-env:UserInstallation=file://${folder}/profile`;
  execFileSync(
    'soffice',
    [profile, '--headless', '--convert-to', 'pdf', '--outdir', folder, join(folder, 'one.docx')],
    { stdio: 'ignore' },
  );
  const text = execFileSync('pdftotext', ['-layout', join(folder, 'one.pdf'), '-'], { encoding: 'utf8' });
  return text.split('\f').filter((page) => page.trim() !== '');
};

describe('the note as a document', () => {
  it('is the same, byte for byte, for the same note', async () => {
    const first = await noteDocx(noteOf('Oakhollow'), seal);
    await new Promise((resolve) => setTimeout(resolve, 1100));
    expect(Buffer.from(first).equals(Buffer.from(await noteDocx(noteOf('Oakhollow'), seal)))).toBe(true);
  });

  it('holds the words, the signature with its meaning, and how to prove it', async () => {
    const text = await words(await noteDocx(noteOf('Oakhollow'), seal));
    for (const part of [
      'Oakhollow',
      'LEFT EYE',
      'pars plana vitrectomy',
      'Signed electronically by A. Surgeon',
      'I performed this operation',
      '1 December 2026',
      seal.code,
    ]) {
      expect(text).toContain(part);
    }
  });

  it('keeps patient data out of its properties', async () => {
    const zip = await JSZip.loadAsync(await noteDocx(noteOf('Oakhollow'), seal));
    for (const name of Object.keys(zip.files).filter((file) => file.startsWith('docProps/'))) {
      expect(await zip.file(name)?.async('string')).not.toContain('Oakhollow');
    }
  });

  it('takes markup in a name for words', async () => {
    expect(await words(await noteDocx(noteOf('<w:p>&"\'</w:p>'), seal))).toContain('<w:p>&"\'</w:p>');
  });

  it('prints with patient, version and page on every page, and a word of any length inside the margins', () => {
    return noteDocx(noteOf('Long'.repeat(60)), seal).then((docx) => {
      const pages = printed(docx);
      expect(pages.length).toBeGreaterThan(1);
      const number = cleanRecord(2).who?.patient?.number ?? '';
      pages.forEach((page, at) => {
        expect(page).toContain(number);
        expect(page).toContain(`page ${at + 1} of ${pages.length}`);
        expect(page).toContain(seal.code);
      });
    });
  });
});

describe('the letter as a document', () => {
  it('holds reader, patient and words, and is the same for the same letter', async () => {
    const note = noteOf('Oakhollow');
    const letter = {
      note,
      code: seal.code,
      sheet: mergeSheet(null, draftLetter('referring-doctor', note.record)),
      recipient: ['Fern Mossgrove', 'Mossgrove Opticians', '4 High Street'],
      on: '2026-12-01',
    };
    const docx = await letterDocx(letter);
    const text = await words(docx);
    for (const part of [
      'Fern Mossgrove',
      '1 December 2026',
      'Oakhollow',
      'Dear ',
      'Yours sincerely',
      seal.code,
    ])
      expect(text).toContain(part);
    expect(Buffer.from(docx).equals(Buffer.from(await letterDocx(letter)))).toBe(true);
  });
});
