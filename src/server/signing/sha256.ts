import { createHash } from 'node:crypto';

/** In hexadecimal; a text is taken as UTF-8. */
export const sha256 = (content: string | Uint8Array): string =>
  createHash('sha256').update(content).digest('hex');
