import { sql } from 'drizzle-orm';
import { beforeEach, describe, expect, it } from 'vitest';
import {
  changeNameAction,
  changePasswordAction,
  endSessionAction,
  signOutAction,
  signOutEverywhereAction,
} from '@/app/(account)/account/actions';
import { forgotAction } from '@/app/(account)/forgot/actions';
import { resetAction } from '@/app/(account)/reset/[token]/actions';
import { signInAction } from '@/app/(account)/sign-in/actions';
import { signUpAction } from '@/app/(account)/sign-up/actions';
import { resendAction, verifyAction } from '@/app/(account)/verify/actions';
import { closeDatabase, useDatabase as openDatabase, reader, write } from '@/db/client';
import { outbox, sessions, tokens, users } from '@/db/schema';
import { createAccountRow } from '@/features/accounts/create-account-row';
import { listMySessions } from '@/features/accounts/reads';
import { requireVerified } from '@/features/accounts/resend-verify';
import { setClock } from '@/server/clock';
import { hashPassword } from '@/server/passwords';
import { currentUser } from '@/server/session';
import { inRequest, newBrowser, type TestRequest } from '../helpers/request';

const HOUR = 3_600_000;
const START = Date.now();
const PASSWORD = 'quiet oak ridge';
let count = 0;
let at = START;

beforeEach(() => {
  at = START;
  setClock(() => at);
});

/** Each test has its own addresses, so that no count of tries is shared. */
const newEmail = () => `person-${++count}@example.test`;
const browserFrom = () => newBrowser(`10.0.${count}.${++count % 250}`);

async function mailsTo(email: string) {
  const all = await reader().select().from(outbox);
  return all.filter((mail) => mail.toEmail === email);
}

async function linkTo(email: string, kind: string): Promise<string> {
  const mail = (await mailsTo(email)).filter((one) => one.kind === kind).at(-1);
  const token = /\/(?:verify|reset)\/([\w-]+)/.exec(mail?.message?.text ?? '')?.[1];
  if (!token) throw new Error(`no link of ${kind} for ${email}`);
  return token;
}

async function signUp(email: string, browser: TestRequest, password = PASSWORD) {
  return inRequest(browser, () => signUpAction({ name: 'Orrin Strom', email, password }));
}

async function signIn(email: string, password: string, browser: TestRequest) {
  return inRequest(browser, () => signInAction({ email, password }));
}

async function whoIs(browser: TestRequest) {
  return inRequest(browser, () => currentUser());
}

async function makeAccount(): Promise<{ email: string; browser: TestRequest }> {
  const email = newEmail();
  const browser = browserFrom();
  await signUp(email, browser);
  const token = await linkTo(email, 'account.verify');
  expect(await inRequest(browser, () => verifyAction({ token, password: PASSWORD }))).toEqual({
    ok: true,
    data: { to: '/clubs' },
  });
  return { email, browser };
}

/** Closes the database and opens the same file, as a new process would. */
async function restart() {
  const [main] = await reader().all<{ file: string }>(sql`PRAGMA database_list`);
  await closeDatabase();
  await openDatabase(`file:${main?.file}`);
}

describe('signing up', () => {
  it('starts no session until the mailed link is used, once', async () => {
    const email = newEmail();
    const browser = browserFrom();
    expect(await signUp(email, browser)).toEqual({ ok: true, data: { email } });
    expect(await whoIs(browser)).toBeNull();
    const token = await linkTo(email, 'account.verify');
    const answers = await Promise.all(
      [1, 2, 3].map(() => inRequest(browser, () => verifyAction({ token, password: PASSWORD }))),
    );
    expect(answers.filter((answer) => answer.ok)).toHaveLength(1);
    expect(await whoIs(browser)).toMatchObject({ email, emailVerifiedAt: at });
  });

  it('answers a known address the same, tells its owner by mail and changes nothing', async () => {
    const { email } = await makeAccount();
    const before = (await reader().select().from(users)).find((user) => user.email === email);
    const known = await signUp(email, browserFrom(), 'another password');
    const other = newEmail();
    const unknown = await signUp(other, browserFrom());
    expect(JSON.stringify(known).replace(email, '')).toBe(JSON.stringify(unknown).replace(other, ''));
    expect((await mailsTo(email)).map((mail) => mail.kind)).toContain('account.exists');
    expect((await reader().select().from(users)).find((user) => user.email === email)).toEqual(before);
  });

  it('lets the owner of an unconfirmed address choose the password, whoever signed up first', async () => {
    const email = newEmail();
    await signUp(email, browserFrom(), 'password of a stranger');
    const stranger = browserFrom();
    await signIn(email, 'password of a stranger', stranger);
    const owner = browserFrom();
    await signUp(email, owner, PASSWORD);
    expect((await signIn(email, PASSWORD, owner)).ok).toBe(false);
    const token = await linkTo(email, 'account.finish');
    expect((await inRequest(owner, () => resetAction({ token, password: PASSWORD }))).ok).toBe(true);
    expect(await whoIs(owner)).toMatchObject({ email, emailVerifiedAt: at });
    expect(await whoIs(stranger)).toBeNull();
    expect((await signIn(email, 'password of a stranger', browserFrom())).ok).toBe(false);
  });

  it('refuses a link older than 48 hours; an unconfirmed account signs in, is told, and may ask for a new one', async () => {
    const email = newEmail();
    const browser = browserFrom();
    await signUp(email, browser);
    const old = await linkTo(email, 'account.verify');
    at = START + 48 * HOUR + 1;
    expect(await inRequest(browser, () => verifyAction({ token: old, password: PASSWORD }))).toMatchObject({
      ok: false,
    });
    expect(await signIn(email, PASSWORD, browser)).toEqual({ ok: true, data: { to: '/verify' } });
    const user = await whoIs(browser);
    expect(() => user && requireVerified(user)).toThrow('Confirm your own e-mail address');
    expect(await inRequest(browser, () => resendAction({}))).toEqual({ ok: true, data: { email } });
    const token = await linkTo(email, 'account.verify');
    expect(token).not.toBe(old);
    expect((await inRequest(browser, () => verifyAction({ token, password: PASSWORD }))).ok).toBe(true);
  });

  it('confirms nothing for the owner of an address who did not make the account, and keeps the link', async () => {
    const email = newEmail();
    await signUp(email, browserFrom(), 'password of a stranger');
    const token = await linkTo(email, 'account.verify');
    const owner = browserFrom();
    const confirm = (password: string) => inRequest(owner, () => verifyAction({ token, password }));
    expect(await confirm(PASSWORD)).toMatchObject({ ok: false, error: { fields: { password: /not the password/ } } });
    expect(await whoIs(owner)).toBeNull();
    expect(await confirm('password of a stranger')).toEqual({ ok: true, data: { to: '/clubs' } });
  });

  it('keeps neither a password nor a link readable in the database', async () => {
    const email = newEmail();
    await signUp(email, browserFrom());
    const token = await linkTo(email, 'account.verify');
    const kept = JSON.stringify([await reader().select().from(users), await reader().select().from(tokens)]);
    expect(kept).not.toContain(PASSWORD);
    expect(kept).not.toContain(token);
    expect(kept).toContain('$argon2id$v=19$m=19456,t=2,p=1$');
  });
});

describe('signing in', () => {
  it('answers an unknown address and a wrong password the same', async () => {
    const { email } = await makeAccount();
    const wrong = await signIn(email, 'not the password', browserFrom());
    const unknown = await signIn(newEmail(), 'not the password', browserFrom());
    expect(wrong).toEqual(unknown);
    expect(wrong).toMatchObject({ ok: false, error: { code: 'invalid' } });
  });

  it('leads only to pages of its own', async () => {
    const { email } = await makeAccount();
    const go = (next: string) => inRequest(browserFrom(), () => signInAction({ email, password: PASSWORD, next }));
    expect(await go('/clubs/hollow/board')).toEqual({ ok: true, data: { to: '/clubs/hollow/board' } });
    expect(await go('//elsewhere.test')).toEqual({ ok: true, data: { to: '/' } });
  });

  it('stops guessing at one account from many addresses, known or not, and over a restart', async () => {
    const { email } = await makeAccount();
    for (const target of [email, newEmail()]) {
      for (let tries = 0; tries < 10; tries++) {
        expect(await signIn(target, `guess ${tries}`, browserFrom())).toMatchObject({ error: { code: 'invalid' } });
      }
      await restart();
      expect(await signIn(target, PASSWORD, browserFrom())).toMatchObject({ error: { code: 'limit' } });
    }
    at = START + 16 * 60_000;
    expect((await signIn(email, PASSWORD, browserFrom())).ok).toBe(true);
  });

  it('stops guessing at many accounts from one address', async () => {
    const browser = newBrowser('10.9.9.9');
    const codes: string[] = [];
    for (let tries = 0; tries < 61; tries++) {
      const answer = await signIn(newEmail(), 'guess', browser);
      codes.push(answer.ok ? 'ok' : answer.error.code);
    }
    expect(new Set(codes.slice(0, 60))).toEqual(new Set(['invalid']));
    expect(codes[60]).toBe('limit');
  });
});

describe('a forgotten password', () => {
  it('answers the same for unknown and known, and mails only a known one', async () => {
    const { email } = await makeAccount();
    const unknown = newEmail();
    const first = await inRequest(browserFrom(), () => forgotAction({ email }));
    const second = await inRequest(browserFrom(), () => forgotAction({ email: unknown }));
    expect(JSON.stringify(first).replace(email, '')).toBe(JSON.stringify(second).replace(unknown, ''));
    expect((await mailsTo(email)).map((mail) => mail.kind)).toContain('account.reset');
    expect(await mailsTo(unknown)).toEqual([]);
  });

  it('is set anew by a link that works once, for an hour, newest only; every session ends', async () => {
    const { email, browser } = await makeAccount();
    await inRequest(browserFrom(), () => forgotAction({ email }));
    const older = await linkTo(email, 'account.reset');
    await inRequest(browserFrom(), () => forgotAction({ email }));
    const token = await linkTo(email, 'account.reset');
    const there = browserFrom();
    const reset = (secret: string, password: string) =>
      inRequest(there, () => resetAction({ token: secret, password }));
    expect(await reset(older, 'a new password')).toMatchObject({ ok: false });
    expect(await reset(token, email)).toMatchObject({ error: { fields: { password: expect.any(String) } } });
    expect(await reset(token, 'a new password')).toEqual({ ok: true, data: { to: '/' } });
    expect(await reset(token, 'one more password')).toMatchObject({ ok: false });
    expect(await whoIs(browser)).toBeNull();
    expect(await whoIs(there)).toMatchObject({ email });
    expect((await signIn(email, PASSWORD, browserFrom())).ok).toBe(false);
    expect((await signIn(email, 'a new password', browserFrom())).ok).toBe(true);
    await inRequest(browserFrom(), () => forgotAction({ email }));
    const late = await linkTo(email, 'account.reset');
    at = START + HOUR + 1;
    expect(await reset(late, 'too late a password')).toMatchObject({ ok: false });
  });

  it('does not take one kind of link for the other', async () => {
    const email = newEmail();
    await signUp(email, browserFrom());
    const token = await linkTo(email, 'account.verify');
    expect((await inRequest(browserFrom(), () => resetAction({ token, password: PASSWORD }))).ok).toBe(false);
  });

  it('cannot be used to fill a mailbox', async () => {
    const { email } = await makeAccount();
    const answers = [];
    for (let tries = 0; tries < 6; tries++) answers.push(await inRequest(browserFrom(), () => forgotAction({ email })));
    expect(answers.filter((answer) => answer.ok).length).toBeLessThan(6);
    expect(answers.at(-1)).toMatchObject({ error: { code: 'limit' } });
  });
});

describe('an account', () => {
  it('lists its browsers, ends one, and not that of another person', async () => {
    const { email, browser } = await makeAccount();
    const phone = browserFrom();
    phone.headers.set('user-agent', 'Mozilla/5.0 (X11; Linux x86_64; rv:130.0) Gecko/20100101 Firefox/130.0');
    await signIn(email, PASSWORD, phone);
    const user = await whoIs(browser);
    if (!user) throw new Error('not signed in');
    const list = await listMySessions(user, at);
    expect(list).toHaveLength(2);
    const other = list.find((session) => !session.here);
    expect(other?.browser).toBe('Firefox on Linux');
    const stranger = (await makeAccount()).browser;
    const id = other?.id ?? '';
    const refused = await inRequest(stranger, () => endSessionAction({ id }));
    expect(refused).toMatchObject({ ok: false, error: { code: 'not_found' } });
    expect(await whoIs(phone)).not.toBeNull();
    expect((await inRequest(browser, () => endSessionAction({ id }))).ok).toBe(true);
    expect(await whoIs(phone)).toBeNull();
    expect(await whoIs(browser)).not.toBeNull();
  });

  it('signs out here, and everywhere', async () => {
    const { email, browser } = await makeAccount();
    const phone = browserFrom();
    const desk = browserFrom();
    await signIn(email, PASSWORD, phone);
    await signIn(email, PASSWORD, desk);
    const stolen = new Map(desk.cookies);
    await inRequest(desk, () => signOutAction({}));
    expect(desk.cookies.size).toBe(0);
    expect(await whoIs({ ...desk, cookies: stolen })).toBeNull();
    expect(await whoIs(phone)).not.toBeNull();
    await inRequest(phone, () => signOutEverywhereAction({}));
    expect(await whoIs(browser)).toBeNull();
    const user = (await reader().select().from(users)).find((row) => row.email === email);
    expect((await reader().select().from(sessions)).filter((row) => row.userId === user?.id)).toEqual([]);
  });

  it('changes its password only with the one that holds, and keeps only this browser signed in', async () => {
    const { email, browser } = await makeAccount();
    const phone = browserFrom();
    await signIn(email, PASSWORD, phone);
    const change = (current: string) =>
      inRequest(browser, () => changePasswordAction({ current, password: 'another good one' }));
    expect(await change('wrong')).toMatchObject({ ok: false, error: { fields: { current: expect.any(String) } } });
    expect((await change(PASSWORD)).ok).toBe(true);
    expect(await whoIs(phone)).toBeNull();
    expect(await whoIs(browser)).not.toBeNull();
    expect((await mailsTo(email)).map((mail) => mail.kind)).toContain('account.password_changed');
  });

  it('changes its name, and nobody signed out changes anything', async () => {
    const { browser } = await makeAccount();
    expect((await inRequest(browser, () => changeNameAction({ name: 'O. Strom' }))).ok).toBe(true);
    expect(await whoIs(browser)).toMatchObject({ name: 'O. Strom' });
    const answer = await inRequest(browserFrom(), () => changeNameAction({ name: 'Nobody' }));
    expect(answer).toMatchObject({ ok: false, error: { code: 'signed_out' } });
  });

  it('made by an invitation is confirmed, takes over an unconfirmed one, and never a confirmed one', async () => {
    const passwordHash = await hashPassword(PASSWORD);
    const join = (email: string) => write((tx) => createAccountRow(tx, { name: 'Guest', email, passwordHash }, at));
    const fresh = newEmail();
    await join(fresh);
    expect(await signIn(fresh, PASSWORD, browserFrom())).toEqual({ ok: true, data: { to: '/' } });
    const begun = newEmail();
    await signUp(begun, browserFrom(), 'password of a stranger');
    await join(begun);
    expect((await signIn(begun, 'password of a stranger', browserFrom())).ok).toBe(false);
    expect(await signIn(begun, PASSWORD, browserFrom())).toEqual({ ok: true, data: { to: '/' } });
    const { email } = await makeAccount();
    await expect(join(email)).rejects.toThrow('already have an account');
  });
});
