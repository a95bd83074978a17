export const SHORTEST_PASSWORD = 10;
export const LONGEST_PASSWORD = 200;

const plain = (text: string) => text.normalize('NFKC').toLowerCase().replace(/\s+/g, '');

/** What is wrong with a new password, in words for its owner; null when nothing is. Length first, after NIST SP 800-63B. */
export function passwordProblem(password: string, owner: { email: string; name: string }): string | null {
  const length = [...password].length;
  if (length < SHORTEST_PASSWORD) return `Use at least ${SHORTEST_PASSWORD} characters. A few plain words do well.`;
  if (length > LONGEST_PASSWORD) return `Use at most ${LONGEST_PASSWORD} characters.`;
  const bare = plain(password);
  const own = [owner.email, owner.email.split('@')[0] ?? '', owner.name].map(plain).filter((word) => word !== '');
  if (own.includes(bare)) return 'Your name or e-mail address is the first thing anyone tries. Choose something else.';
  if (new Set(bare).size < 3) return 'The same character over and over is quickly guessed. Choose something else.';
  return null;
}
