import { exportSightings } from '@/features/logs/export-sightings';
import { sightingsFileSchema } from '@/features/logs/sightings-schema';
import { clubRoute } from '@/server/doors';

export const GET = clubRoute('log.read', {
  query: sightingsFileSchema,
  run: async ({ scope, query, now }) => {
    const { name, csv } = await exportSightings(scope, query, now);
    return new Response(csv, {
      headers: {
        'Content-Type': 'text/csv; charset=utf-8',
        'Content-Disposition': `attachment; filename="${name}"`,
        'Cache-Control': 'private, no-store',
      },
    });
  },
});
