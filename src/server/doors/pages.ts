import { headers } from 'next/headers';
import { redirect, notFound as showNotFound } from 'next/navigation';
import type { ReactNode } from 'react';
import type { Permission } from '@/core/permissions';
import { AppError } from '../errors';
import type { ClubScope } from '../scope';
import { type CurrentUser, currentUser } from '../session';
import { requireScope, requireUser } from './enter';
import { type Params, type Search, withInfo } from './info';

interface PageProps {
  params: Promise<Params>;
  searchParams: Promise<Search>;
}

interface Asked {
  params: Params;
  search: Search;
}

/** Sends a signed-out visitor to sign in and back; shows the same page for a stranger, a missing thing and a closed one. */
async function turnAway(error: unknown): Promise<never> {
  if (error instanceof AppError) {
    if (error.code === 'signed_out') {
      const path = (await headers()).get('x-windrest-path') ?? '/';
      redirect(`/sign-in?next=${encodeURIComponent(path)}`);
    }
    if (error.code === 'not_found' || error.code === 'forbidden') showNotFound();
  }
  throw error;
}

async function open<C>(
  props: PageProps,
  enter: (asked: Asked) => Promise<C>,
  render: (ctx: C & Asked) => Promise<ReactNode>,
) {
  const asked = { params: await props.params, search: await props.searchParams };
  try {
    return await render({ ...(await enter(asked)), ...asked });
  } catch (error) {
    return turnAway(error);
  }
}

export function clubPage(
  permission: Permission,
  render: (ctx: { scope: ClubScope; user: CurrentUser } & Asked) => Promise<ReactNode>,
) {
  const page = (props: PageProps) => open(props, ({ params }) => requireScope(params.club, permission), render);
  return withInfo(page, { kind: 'page', who: 'club', permission, takes: null });
}

export function accountPage(render: (ctx: { user: CurrentUser } & Asked) => Promise<ReactNode>) {
  const page = (props: PageProps) => open(props, async () => ({ user: await requireUser() }), render);
  return withInfo(page, { kind: 'page', who: 'account', permission: null, takes: null });
}

export function publicPage(render: (ctx: { user: CurrentUser | null } & Asked) => Promise<ReactNode>) {
  const page = (props: PageProps) => open(props, async () => ({ user: await currentUser() }), render);
  return withInfo(page, { kind: 'page', who: 'anyone', permission: null, takes: null });
}
