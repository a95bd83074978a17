import { auditFilterSchema } from '@/features/clubs/audit-schema';
import { exportAudit } from '@/features/clubs/export-audit';
import { clubRoute } from '@/server/doors';

export const GET = clubRoute('audit.read', {
  query: auditFilterSchema,
  run: async ({ scope, query, now }) => {
    const { name, csv } = await exportAudit(scope, query, now);
    return new Response(csv, {
      headers: {
        'Content-Type': 'text/csv; charset=utf-8',
        'Content-Disposition': `attachment; filename="${name}"`,
        'Cache-Control': 'private, no-store',
      },
    });
  },
});
