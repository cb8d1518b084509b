const DIGITS = 'ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz0123456789+/';

/** @returns the bytes of base64 text (RFC 4648 §4) without line breaks; for embedded binaries, which are well-formed */
export function bytesFromBase64(text: string): Uint8Array<ArrayBuffer> {
  const digits = text.replace(/=+$/, '');
  const bytes = new Uint8Array(Math.floor((digits.length * 3) / 4));
  let bits = 0;
  let held = 0;
  let at = 0;
  for (const digit of digits) {
    bits = ((bits << 6) | DIGITS.indexOf(digit)) & 0xffff;
    held += 6;
    if (held >= 8) {
      held -= 8;
      bytes[at++] = (bits >> held) & 0xff;
    }
  }
  return bytes;
}
