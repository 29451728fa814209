import JSZip from 'jszip';

/** Before anything else in the package, as readers expect; the rest by name. */
const first = ['[Content_Types].xml', '_rels/.rels', 'word/document.xml'];
const order = (name: string) => {
  const index = first.indexOf(name);
  return index < 0 ? first.length : index;
};

const FIXED = new Date(Date.UTC(2000, 0, 1));

/** Ids that are drawn at random, numbered in the order in which they first appear. */
const renumberRelations = (files: Map<string, string>): void => {
  const names = new Map<string, string>();
  for (const text of files.values()) {
    for (const [, id = ''] of text.matchAll(/<Relationship\b[^>]*\bId="(rId[\w-]{6,})"/g)) {
      if (!names.has(id)) names.set(id, `rIdN${names.size + 1}`);
    }
  }
  if (names.size === 0) return;
  for (const [name, text] of files) {
    files.set(
      name,
      text.replace(/"(rId[\w-]{6,})"/g, (whole, id: string) =>
        names.has(id) ? `"${names.get(id)}"` : whole,
      ),
    );
  }
};

/**
 * The same document, byte for byte the same on every run: fixed times, relation ids in order, drawing ids counted from one, parts in a fixed
 * order. `at` is the instant that the core properties carry, ISO 8601.
 */
export const normalizeDocx = async (docx: Uint8Array, at: string): Promise<Uint8Array> => {
  const zip = await JSZip.loadAsync(docx);
  const texts = new Map<string, string>();
  const binaries = new Map<string, Uint8Array>();
  for (const name of Object.keys(zip.files).sort((a, b) => order(a) - order(b) || (a < b ? -1 : 1))) {
    const file = zip.file(name);
    if (file === null) continue;
    if (/\.(?:xml|rels)$/.test(name)) texts.set(name, await file.async('string'));
    else binaries.set(name, await file.async('uint8array'));
  }
  renumberRelations(texts);
  const out = new JSZip();
  const options = { date: FIXED, createFolders: false } as const;
  for (const [name, text] of texts) {
    let drawing = 0;
    const fixed =
      name === 'docProps/core.xml'
        ? text.replace(/(<dcterms:(?:created|modified)[^>]*>)[^<]*/g, `$1${at}`)
        : text.replace(/(<wp:docPr\b[^>]*?\bid=")\d+/g, (_, head: string) => {
            drawing += 1;
            return `${head}${drawing}`;
          });
    out.file(name, fixed, options);
  }
  for (const [name, content] of binaries) out.file(name, content, options);
  return out.generateAsync({
    type: 'uint8array',
    compression: 'DEFLATE',
    compressionOptions: { level: 6 },
    platform: 'DOS',
  });
};
