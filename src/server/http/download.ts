const DOCX = 'application/vnd.openxmlformats-officedocument.wordprocessingml.document';

/** A document to keep. */
export const download = (name: string, content: Uint8Array, type: string = DOCX): Response =>
  new Response(Buffer.from(content), {
    headers: { 'content-type': type, 'content-disposition': `attachment; filename="${name}"` },
  });
