import type { Tx } from '@/db/client';
import { env } from '@/env';
import { newId } from '@/lib/ids';
import { hashSecret, newSecret } from '@/lib/secrets';
import { insertToken, spendOlderTokens, type TokenPurpose } from './data';

const HOUR = 60 * 60_000;

const LINKS: Record<TokenPurpose, { path: string; lastsMs: number }> = {
  verify_email: { path: '/verify', lastsMs: 48 * HOUR },
  reset_password: { path: '/reset', lastsMs: HOUR },
};

export interface IssuedLink {
  tokenId: string;
  url: string;
}

/** Makes a link that works once; the links of that purpose sent before stop working. Only a hash is kept. */
export async function issueLink(tx: Tx, userId: string, purpose: TokenPurpose, now: number): Promise<IssuedLink> {
  const { path, lastsMs } = LINKS[purpose];
  const secret = newSecret();
  const tokenId = newId('token');
  await spendOlderTokens(tx, userId, purpose, now);
  await insertToken(tx, {
    id: tokenId,
    purpose,
    tokenHash: hashSecret(secret),
    userId,
    createdAt: now,
    expiresAt: now + lastsMs,
  });
  return { tokenId, url: `${env.appUrl}${path}/${secret}` };
}
