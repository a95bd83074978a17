import { z } from 'zod';
import { readMailState } from '@/features/mail/reads';
import { publicRoute } from '@/server/doors';
import { readBaseHealth } from '@/server/health';
import { version } from '../../../../package.json';

export const GET = publicRoute({
  query: z.object({}),
  run: async ({ now }) => {
    const base = await readBaseHealth(now);
    const mail = base.database === 'ok' ? await readMailState() : null;
    const ok = base.database === 'ok';
    const status = ok ? 200 : 503;
    return Response.json({ ok, version, ...base, mail }, { status, headers: { 'Cache-Control': 'no-store' } });
  },
});
