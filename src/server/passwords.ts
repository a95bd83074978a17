import { hash, verify } from '@node-rs/argon2';

/** OWASP Password Storage Cheat Sheet: argon2id, 19 MiB, two passes, one lane. */
const OWASP = { memoryCost: 19456, timeCost: 2, parallelism: 1, outputLen: 32 };

export function hashPassword(password: string): Promise<string> {
  return hash(password.normalize('NFKC'), OWASP);
}

/** Checked when no account is found, so that both answers take the same work. */
let decoy: Promise<string> | undefined;

export async function passwordMatches(stored: string | null, password: string): Promise<boolean> {
  decoy ??= hashPassword('nobody-has-this-password');
  const matches = await verify(stored ?? (await decoy), password.normalize('NFKC'));
  return stored !== null && matches;
}
