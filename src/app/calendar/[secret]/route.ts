import { z } from 'zod';
import { etagMatches, readFeed } from '@/features/calendar/read-feed';
import { publicRoute } from '@/server/doors';
import { notFound } from '@/server/errors';

const ADDRESS = /^([A-Za-z0-9_-]{16,64})\.ics$/;

/** The secret in the address is the permission. */
export const GET = publicRoute({
  query: z.object({}),
  run: async ({ params, request, now }) => {
    const secret = ADDRESS.exec(params.secret ?? '')?.[1];
    if (secret === undefined) throw notFound();
    const { body, etag } = await readFeed(secret, now);
    const headers = { ETag: etag, 'Cache-Control': 'private, no-cache', 'X-Robots-Tag': 'noindex' };
    if (etagMatches(request.headers.get('if-none-match'), etag)) return new Response(null, { status: 304, headers });
    return new Response(body, {
      headers: {
        ...headers,
        'Content-Type': 'text/calendar; charset=utf-8',
        'Content-Disposition': 'inline; filename="sits.ics"',
      },
    });
  },
});
