import { exportReport } from '@/features/report/export-report';
import { reportFileSchema } from '@/features/report/report-schema';
import { clubRoute } from '@/server/doors';

export const GET = clubRoute('report.read', {
  query: reportFileSchema,
  run: async ({ scope, query, now }) => {
    const { name, csv } = await exportReport(scope, query, now);
    return new Response(csv, {
      headers: {
        'Content-Type': 'text/csv; charset=utf-8',
        'Content-Disposition': `attachment; filename="${name}"`,
        'Cache-Control': 'private, no-store',
      },
    });
  },
});
