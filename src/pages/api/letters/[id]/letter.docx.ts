import { download } from '../../../../server/http/download.ts';
import { route } from '../../../../server/http/route.ts';
import { openDocument } from '../../../../server/letters/document.ts';

/** What was sent, or what would be sent now. */
export const GET = route({
  action: 'letter:read',
  run: async ({ visit, params }) => {
    const found = await openDocument(visit, params.id ?? '');
    return found.ok ? download(found.value.name, found.value.docx) : found;
  },
});
