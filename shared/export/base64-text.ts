const DIGITS = 'ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz0123456789+/';

/** Codes of the 64 digits and, last, of the padding. */
const CODES = Uint8Array.from(`${DIGITS}=`, digit => digit.charCodeAt(0));
const PADDING = 64;

/** Whole groups of three bytes at a time: as many arguments as every engine lets a call have. */
const PIECE = 3 * 4096;

/** @returns bytes as base64 text (RFC 4648 §4), padded, without line breaks */
export function base64FromBytes(bytes: Uint8Array): string {
  const pieces: string[] = [];
  for (let at = 0; at < bytes.length; at += PIECE) pieces.push(pieceText(bytes.subarray(at, at + PIECE)));
  return pieces.join('');
}

function pieceText(bytes: Uint8Array): string {
  const codes = new Uint8Array(4 * Math.ceil(bytes.length / 3));
  let out = 0;
  for (let at = 0; at < bytes.length; at += 3) {
    const left = bytes.length - at;
    // Beyond the end there is no byte: it counts as 0 here, and its digits become padding.
    const group = (bytes[at] << 16) | (bytes[at + 1] << 8) | bytes[at + 2];
    codes[out++] = CODES[group >> 18];
    codes[out++] = CODES[(group >> 12) & 63];
    codes[out++] = CODES[left > 1 ? (group >> 6) & 63 : PADDING];
    codes[out++] = CODES[left > 2 ? group & 63 : PADDING];
  }
  return String.fromCharCode(...codes);
}
