import { exportQuery } from '@/features/exchange/exchange-schema';
import { exportGround } from '@/features/exchange/export-ground';
import { clubRoute } from '@/server/doors';

export const GET = clubRoute('ground.export', {
  query: exportQuery,
  run: async ({ scope, query, now }) => {
    const { name, type, body } = await exportGround(scope, query, now);
    return new Response(typeof body === 'string' ? body : Buffer.from(body), {
      headers: {
        'Content-Type': type,
        'Content-Disposition': `attachment; filename="${name}"`,
        'Cache-Control': 'private, no-store',
      },
    });
  },
});
