import { z } from 'zod';
import { readKeptMail } from '@/features/mail/reads';
import { publicRoute } from '@/server/doors';
import { notFound } from '@/server/errors';

/** The HTML of a kept mail alone, with no script and no origin, as a mail reader would show it. */
const HEADERS = {
  'Content-Type': 'text/html; charset=utf-8',
  'Content-Security-Policy': "sandbox allow-popups; default-src 'none'; style-src 'unsafe-inline'",
  'Cache-Control': 'no-store',
};

export const GET = publicRoute({
  query: z.object({}),
  run: async ({ params }) => {
    const mail = await readKeptMail(params.id ?? '');
    if (!mail?.html) throw notFound();
    return new Response(mail.html, { headers: HEADERS });
  },
});
