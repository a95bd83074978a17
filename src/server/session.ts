import { Lucia, TimeSpan } from 'lucia';
import { cookies, headers } from 'next/headers';
import { sessionAdapter } from '@/db/queries/sessions';
import { env } from '@/env';
import { now } from './clock';

declare module 'lucia' {
  interface Register {
    Lucia: typeof lucia;
    DatabaseSessionAttributes: { createdAt: number; userAgent: string; address: string };
    DatabaseUserAttributes: { email: string; name: string; emailVerifiedAt: number | null };
  }
}

/** The only file that knows the session library. */
const lucia = new Lucia(sessionAdapter, {
  sessionExpiresIn: new TimeSpan(30, 'd'),
  sessionCookie: {
    name: 'windrest_session',
    attributes: { secure: env.appUrl.startsWith('https:'), sameSite: 'lax', path: '/' },
  },
  getUserAttributes: (row) => ({ email: row.email, name: row.name, emailVerifiedAt: row.emailVerifiedAt }),
  getSessionAttributes: (row) => row,
});

export interface CurrentUser {
  id: string;
  email: string;
  name: string;
  emailVerifiedAt: number | null;
  /** The raw id, as in the cookie. */
  sessionId: string;
}

export async function currentUser(): Promise<CurrentUser | null> {
  const id = (await cookies()).get(lucia.sessionCookieName)?.value;
  if (!id) return null;
  const { session, user } = await lucia.validateSession(id);
  if (!session || !user) return null;
  return { id: user.id, email: user.email, name: user.name, emailVerifiedAt: user.emailVerifiedAt, sessionId: id };
}

/** Where the request comes from: the address the nearest proxy saw, and the browser's own name. */
export async function requestSource(): Promise<{ address: string; userAgent: string }> {
  const all = await headers();
  return {
    address: all.get('x-forwarded-for')?.split(',').at(-1)?.trim() || 'unknown',
    userAgent: (all.get('user-agent') ?? 'unknown').slice(0, 200),
  };
}

export async function startSession(userId: string): Promise<void> {
  const source = await requestSource();
  const session = await lucia.createSession(userId, { createdAt: now(), ...source });
  const cookie = lucia.createSessionCookie(session.id);
  (await cookies()).set(cookie.name, cookie.value, cookie.attributes);
}

export async function endSession(sessionId: string): Promise<void> {
  await lucia.invalidateSession(sessionId);
  await forgetSessionCookie();
}

export async function forgetSessionCookie(): Promise<void> {
  const blank = lucia.createBlankSessionCookie();
  (await cookies()).set(blank.name, blank.value, blank.attributes);
}
