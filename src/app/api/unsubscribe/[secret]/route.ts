import { z } from 'zod';
import { env } from '@/env';
import { readNoticeLink, unsubscribe } from '@/features/notices/unsubscribe';
import { publicRoute } from '@/server/doors';
import { notFound } from '@/server/errors';

const query = z.object({});

/** What a mail program presses (RFC 8058): no account, no cookie, no page; the secret is the permission. */
export const POST = publicRoute({
  query,
  run: async ({ params, now }) => {
    await unsubscribe(params.secret ?? '', now);
    return new Response(null, { status: 204, headers: { 'Cache-Control': 'no-store' } });
  },
});

/** A person who opens the address is asked first. */
export const GET = publicRoute({
  query,
  run: async ({ params }) => {
    const secret = params.secret ?? '';
    if (!(await readNoticeLink(secret))) throw notFound();
    return Response.redirect(`${env.appUrl}/unsubscribe/${secret}`, 303);
  },
});
