import canonicalize from 'canonicalize';

/** Canonical JSON by RFC 8785: the same value gives the same text on any machine. */
export const canonical = (value: unknown): string => {
  const text = canonicalize(value);
  if (text === undefined) throw new TypeError('Only JSON values have a canonical form');
  return text;
};

/** Letters and figures that are not mistaken for one another when read aloud or copied. */
const ALPHABET = '23456789ABCDEFGHJKMNPQRSTUVWXYZ';

/** Twelve signs in threes made from a SHA-256 in hexadecimal: short enough to print, long enough to find the note. */
export const verificationCode = (sha256: string): string => {
  let value = BigInt(`0x${sha256}`);
  const base = BigInt(ALPHABET.length);
  let code = '';
  for (let place = 0; place < 12; place += 1) {
    code += ALPHABET[Number(value % base)];
    value /= base;
  }
  return (code.match(/.{3}/g) ?? []).join('-');
};
