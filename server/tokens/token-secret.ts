import { createHash, randomBytes, timingSafeEqual } from 'node:crypto';

const PATTERN = /^strand_([1-9]\d{0,14})_([A-Za-z0-9_-]{43})$/;

/** A new random secret: 256 bits, so a plain SHA-256 is enough to keep it. */
export function newSecret(): string {
  return randomBytes(32).toString('base64url');
}

export function hashSecret(secret: string): string {
  return createHash('sha256').update(secret).digest('hex');
}

/** Compares in constant time. */
export function isSecret(secret: string, hash: string): boolean {
  return timingSafeEqual(Buffer.from(hashSecret(secret), 'hex'), Buffer.from(hash, 'hex'));
}

/** What the holder of a token writes: `strand_<id>_<secret>`. */
export function formatToken(id: number, secret: string): string {
  return `strand_${id}_${secret}`;
}

export function parseToken(text: string): { id: number; secret: string } | undefined {
  const match = PATTERN.exec(text);
  const [, id, secret] = match ?? [];
  return id === undefined || secret === undefined ? undefined : { id: Number(id), secret };
}
