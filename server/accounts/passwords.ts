import { hash, verify } from '@node-rs/argon2';
import { randomUUID } from 'node:crypto';

/** Argon2id (the package's default) as OWASP's Password Storage Cheat Sheet gives it: 19 MiB, 2 passes, 1 lane. */
const COST = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

export function hashPassword(password: string): Promise<string> {
  return hash(password, COST);
}

/** A hash that no password gives, made once: an unknown name must cost the same time as a known one. */
let nobodysHash: Promise<string> | undefined;

/**
 * @param stored the person's hash, or undefined where there is no such person
 * @returns whether the password is theirs; takes as long when there is nobody
 */
export async function passwordMatches(stored: string | undefined, password: string): Promise<boolean> {
  nobodysHash ??= hashPassword(randomUUID());
  const matches = await verify(stored ?? (await nobodysHash), password);
  return matches && stored !== undefined;
}
