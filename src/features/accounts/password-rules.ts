import { PASSWORD_ERRORS } from './words/errors';
export const SHORTEST_PASSWORD = 10;
export const LONGEST_PASSWORD = 200;

const plain = (text: string) => text.normalize('NFKC').toLowerCase().replace(/\s+/g, '');

/** What is wrong with a new password, in words for its owner; null when nothing is. Length first, after NIST SP 800-63B. */
export function passwordProblem(password: string, owner: { email: string; name: string }): string | null {
  const length = [...password].length;
  if (length < SHORTEST_PASSWORD) return PASSWORD_ERRORS.short(SHORTEST_PASSWORD);
  if (length > LONGEST_PASSWORD) return PASSWORD_ERRORS.long(LONGEST_PASSWORD);
  const bare = plain(password);
  const own = [owner.email, owner.email.split('@')[0] ?? '', owner.name].map(plain).filter((word) => word !== '');
  if (own.includes(bare)) return PASSWORD_ERRORS.ownName;
  if (new Set(bare).size < 3) return PASSWORD_ERRORS.sameCharacter;
  return null;
}
