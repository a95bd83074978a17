import { z } from 'zod';
import { exportHarvest } from '@/features/harvest/export-harvest';
import { clubRoute } from '@/server/doors';

export const GET = clubRoute('harvest.read', {
  query: z.object({ year: z.coerce.number().int().min(2000).max(2100) }),
  run: async ({ scope, query, now }) => {
    const { name, csv } = await exportHarvest(scope, query.year, now);
    return new Response(csv, {
      headers: {
        'Content-Type': 'text/csv; charset=utf-8',
        'Content-Disposition': `attachment; filename="${name}"`,
        'Cache-Control': 'private, no-store',
      },
    });
  },
});
