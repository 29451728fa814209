import { createHash } from 'node:crypto';
import { z } from 'zod';
import { canonical, verificationCode } from '../../src/domain/signing/canonical.ts';
import { BadInput, jsonOf, print, textOf } from './input.ts';

const proof = z.object({
  canonical: z.string(),
  sha256: z.string().regex(/^[0-9a-f]{64}$/),
  verificationCode: z.string(),
});

const isCanonical = (text: string): boolean => {
  try {
    return canonical(JSON.parse(text)) === text;
  } catch {
    return false;
  }
};

/** verify FILE: a proof exported from the application; exit 1 when it does not hold. */
export const verify = (args: string[]): number => {
  const read = proof.safeParse(jsonOf(textOf(args[0]), args[0] ?? ''));
  if (!read.success) throw new BadInput('not a proof: it needs canonical, sha256 and verificationCode');
  const { canonical: text, sha256, verificationCode: code } = read.data;
  const holds = {
    canonicalForm: isCanonical(text),
    sha256: createHash('sha256').update(text).digest('hex') === sha256,
    verificationCode: verificationCode(sha256) === code,
  };
  const isWhole = Object.values(holds).every((one) => one);
  print({ holds: isWhole, ...holds });
  return isWhole ? 0 : 1;
};
