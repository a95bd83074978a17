import { unstable_rethrow } from 'next/navigation';
import type { z } from 'zod';
import type { Permission } from '@/core/permissions';
import { now } from '../clock';
import { HTTP_STATUS } from '../errors';
import { mapError } from '../map-error';
import type { ClubScope } from '../scope';
import type { CurrentUser } from '../session';
import { requireScope, requireUser } from './enter';
import { type Params, withInfo } from './info';
import { plainIssue } from './plain-issue';

interface Context {
  params: Promise<Params>;
}

interface Route<C, S extends z.ZodType> {
  /** The query string's shape. */
  query: S;
  /** A Response is sent as it is, anything else as JSON. */
  run: (ctx: C & { query: z.output<S>; params: Params; request: Request; now: number }) => Promise<unknown>;
}

const PRIVATE = { 'Cache-Control': 'private, no-store' };

async function answer<C, S extends z.ZodType>(
  route: Route<C, S>,
  enter: (params: Params) => Promise<C>,
  request: Request,
  context: Context,
): Promise<Response> {
  const url = new URL(request.url);
  try {
    const params = await context.params;
    const entered = await enter(params);
    const query = route.query.parse(Object.fromEntries(url.searchParams), { error: plainIssue });
    const result = await route.run({ ...entered, query, params, request, now: now() });
    return result instanceof Response ? result : Response.json(result, { headers: PRIVATE });
  } catch (error) {
    unstable_rethrow(error);
    const body = mapError(error, `route:${url.pathname}`);
    return Response.json({ error: body }, { status: HTTP_STATUS[body.code], headers: PRIVATE });
  }
}

export function clubRoute<S extends z.ZodType>(
  permission: Permission,
  route: Route<{ scope: ClubScope; user: CurrentUser }, S>,
) {
  const handle = (request: Request, context: Context) =>
    answer(route, (params) => requireScope(params.club, permission), request, context);
  return withInfo(handle, { kind: 'route', who: 'club', permission, takes: route.query });
}

export function accountRoute<S extends z.ZodType>(route: Route<{ user: CurrentUser }, S>) {
  const handle = (request: Request, context: Context) =>
    answer(route, async () => ({ user: await requireUser() }), request, context);
  return withInfo(handle, { kind: 'route', who: 'account', permission: null, takes: route.query });
}

/** Asks nobody who they are: such a route answers even when sessions cannot be read. */
export function publicRoute<S extends z.ZodType>(route: Route<object, S>) {
  const handle = (request: Request, context: Context) => answer(route, async () => ({}), request, context);
  return withInfo(handle, { kind: 'route', who: 'anyone', permission: null, takes: route.query });
}
