/**
 * Letters and digits that are not taken for one another on a greasy tag: no 0 O, 1 I L, 5 S, 8 B, 2 Z, U V.
 * Twenty-three signs; four of them give 279,841 codes, which a shop does not use up.
 */
export const CODE_ALPHABET = "34679ACDEFGHJKMNPQRTWXY";
export const CODE_LENGTH = 4;

/**
 * Makes a short code out of random bytes.
 * @param bytes at least CODE_LENGTH random bytes; bytes that would bias the choice are skipped
 * @returns the code, or null when too few usable bytes were given
 */
export function codeFromBytes(bytes: Uint8Array): string | null {
  const limit = 256 - (256 % CODE_ALPHABET.length);
  let code = "";
  for (const byte of bytes) {
    if (byte >= limit) continue;
    code += CODE_ALPHABET[byte % CODE_ALPHABET.length];
    if (code.length === CODE_LENGTH) return code;
  }
  return null;
}

/**
 * Reads a tag as a person typed it or a scanner sent it: a bare code, a code with spaces or dashes in lower case,
 * or the whole address printed in the QR.
 * @returns the code in capitals, or null when it cannot be one
 */
export function readCode(typed: string): string | null {
  const text = typed.trim();
  const fromAddress = /\/t\/([^/?#\s]+)\/?(?:[?#].*)?$/i.exec(text)?.[1];
  const code = (fromAddress ?? text).replace(/[\s\-.]/g, "").toUpperCase();
  if (code.length !== CODE_LENGTH) return null;
  for (const sign of code) if (!CODE_ALPHABET.includes(sign)) return null;
  return code;
}
