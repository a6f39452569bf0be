import { hash, verify } from '@node-rs/argon2';
import { randomBytes } from 'node:crypto';

/** Stands in for the hash of somebody unknown, so that an unknown e-mail takes as long as a wrong password. */
let decoy: Promise<string> | undefined;

/**
 * Argon2id (RFC 9106) with the library's defaults: 19 MiB, two passes, one lane. Source of the choice: OWASP Password
 * Storage Cheat Sheet, one of the settings it names (from memory).
 */
export function hashPassword(password: string): Promise<string> {
  return hash(password);
}

/** Whether the password belongs to the hash; without a hash the same work is done and the answer is no. */
export async function isPassword(password: string, passwordHash: string | undefined): Promise<boolean> {
  decoy ??= hash(randomBytes(32));
  const isMatch = await verify(passwordHash ?? (await decoy), password);
  return isMatch && passwordHash !== undefined;
}
