import { refresh } from 'next/cache';
import { unstable_rethrow } from 'next/navigation';
import type { z } from 'zod';
import type { Permission } from '@/core/permissions';
import { now } from '../clock';
import type { ErrorBody } from '../errors';
import { mapError } from '../map-error';
import type { ClubScope } from '../scope';
import { type CurrentUser, currentUser } from '../session';
import { requireScope, requireUser } from './enter';
import { withInfo } from './info';
import { plainIssue } from './plain-issue';

/** What every action answers: never a thrown error, so a form can keep what was typed. */
export type ActionResult<T> = { ok: true; data: T } | { ok: false; error: ErrorBody };

interface Action<C, S extends z.ZodType, T> {
  input: S;
  run: (ctx: C & { input: z.output<S>; now: number }) => Promise<T>;
}

async function pass<C, S extends z.ZodType, T>(
  kind: string,
  enter: () => Promise<C>,
  action: Action<C, S, T>,
  raw: unknown,
): Promise<ActionResult<T>> {
  try {
    const ctx = await enter();
    const input = action.input.parse(raw, { error: plainIssue });
    const data = await action.run({ ...ctx, input, now: now() });
    refresh();
    return { ok: true, data };
  } catch (error) {
    unstable_rethrow(error);
    return { ok: false, error: mapError(error, kind) };
  }
}

export function clubAction<S extends z.ZodType, T>(
  action: Action<{ scope: ClubScope; user: CurrentUser }, S, T> & { permission: Permission },
) {
  const run = (club: string, raw: z.input<S>) =>
    pass(`action:${action.permission}`, () => requireScope(club, action.permission), action, raw);
  return withInfo(run, { kind: 'action', who: 'club', permission: action.permission, takes: action.input });
}

export function accountAction<S extends z.ZodType, T>(action: Action<{ user: CurrentUser }, S, T>) {
  const run = (raw: z.input<S>) => pass('action:account', async () => ({ user: await requireUser() }), action, raw);
  return withInfo(run, { kind: 'action', who: 'account', permission: null, takes: action.input });
}

export function publicAction<S extends z.ZodType, T>(action: Action<{ user: CurrentUser | null }, S, T>) {
  const run = (raw: z.input<S>) => pass('action:public', async () => ({ user: await currentUser() }), action, raw);
  return withInfo(run, { kind: 'action', who: 'anyone', permission: null, takes: action.input });
}
