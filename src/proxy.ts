import { type NextRequest, NextResponse } from 'next/server';

/** Tells pages their own path, so that signing in can lead back to it. */
export function proxy(request: NextRequest) {
  const headers = new Headers(request.headers);
  headers.set('x-windrest-path', `${request.nextUrl.pathname}${request.nextUrl.search}`);
  return NextResponse.next({ request: { headers } });
}

export const config = { matcher: ['/((?!_next/|api/|.*\\..*).*)'] };
