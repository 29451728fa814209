import { z } from 'zod';
import { type Sheet, sheet } from '../drafting/sheet.ts';

/** PUT /api/letters/ID with `If-Match: "REVISION"`. Of the sheet only the words are taken over. */
export const saveLetterInput = z.strictObject({ sheet, recipientId: z.uuid().nullable() });
export type SaveLetter = z.infer<typeof saveLetterInput>;

/** POST /api/letters/ID/send with `If-Match: "REVISION"`: by e-mail, or printed and then handed over or posted. */
export const sendLetterInput = z.strictObject({ by: z.enum(['mail', 'paper']).default('mail') });
export type SendLetter = z.infer<typeof sendLetterInput>;

/** GET /api/letters/ID: how far a letter is, and what it says now. */
export interface LetterView {
  state: 'waiting' | 'queued' | 'sent' | 'failed';
  revision: number;
  sheet: Sheet;
  recipientId: string | null;
  /** Why it was not sent, or not yet. */
  lastError: string | null;
  /** In words, by the unit's clock. */
  sentAt: string | null;
  /** The address that it went to; `null` once sent means on paper. */
  sentTo: string | null;
}
