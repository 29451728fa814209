import { z } from 'zod';
import { sheet } from '../drafting/sheet.ts';

/** PUT /api/letters/ID with `If-Match: "REVISION"`. */
export const saveLetterInput = z.strictObject({ sheet, recipientId: z.uuid().nullable() });
export type SaveLetter = z.infer<typeof saveLetterInput>;
