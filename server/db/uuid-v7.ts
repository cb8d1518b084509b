import { randomBytes } from 'node:crypto';

/**
 * A new identifier that sorts by the time of its making, so that "newest first" is the primary key's order.
 *
 * @param timeMs milliseconds since 1970
 * @param random 10 bytes; random ones unless given
 * @see RFC 9562, 5.7
 */
export function uuidV7(timeMs = Date.now(), random: Buffer = randomBytes(10)): string {
  const bytes = Buffer.alloc(16);
  bytes.writeUIntBE(timeMs, 0, 6);
  random.copy(bytes, 6, 0, 10);
  bytes[6] = 0x70 | (bytes[6] & 0x0f);
  bytes[8] = 0x80 | (bytes[8] & 0x3f);
  const hex = bytes.toString('hex');
  return [hex.slice(0, 8), hex.slice(8, 12), hex.slice(12, 16), hex.slice(16, 20), hex.slice(20)].join('-');
}

/** @returns whether a text is a UUID; anything else would make PostgreSQL refuse the query */
export function isUuid(text: string): boolean {
  return /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i.test(text);
}
