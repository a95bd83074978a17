import { createHash, randomBytes } from 'node:crypto';

/** 192 random bits, safe in an address. */
export function newSecret(): string {
  return randomBytes(24).toString('base64url');
}

/** What is stored in place of a secret: long random secrets need no slow hash. */
export function hashSecret(secret: string): string {
  return createHash('sha256').update(secret).digest('hex');
}
