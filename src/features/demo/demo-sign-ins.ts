import { reader } from '@/db/client';
import { DEMO_SLUG } from './build-demo';
import { listSignIns } from './data';
import { DEMO_PASSWORD, MEMBERS, PEOPLE } from './people';
import { SECOND_CLUB_NAME } from './second-club';
import { SIGN_IN_WORDS } from './words/sign-ins';

/** A table of who can sign in to the demo; null when this database is not the demo's. */
export async function demoSignIns(): Promise<string | null> {
  const found = await listSignIns(reader(), DEMO_SLUG);
  const known = MEMBERS.flatMap(({ key }) => found.filter(({ email }) => email === `${key}@example.org`));
  if (known.length === 0) return null;
  const second = PEOPLE.filter(({ key }) => key === 'juno').map(({ email }) => email);
  const lines = known.map(({ name, role, email }) => {
    const more = second.includes(email) ? `  ${SIGN_IN_WORDS.adminToo(SECOND_CLUB_NAME)}` : '';
    return `  ${name.padEnd(18)}${role.padEnd(12)}${email}${more}`;
  });
  return [SIGN_IN_WORDS.password, `  ${DEMO_PASSWORD}`, ...lines].join('\n');
}
