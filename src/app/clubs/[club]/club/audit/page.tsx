import type { Metadata } from 'next';
import { auditFilterSchema, auditSearch } from '@/features/clubs/audit-schema';
import { AuditFilters } from '@/features/clubs/components/audit-filters';
import { AuditTable } from '@/features/clubs/components/audit-table';
import { readAudit } from '@/features/clubs/read-audit';
import { clubPage } from '@/server/doors';
import { buttonClasses } from '@/ui/button';
import { EmptyState, Notice } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';
import { Pager } from '@/ui/pager';

export const metadata: Metadata = { title: 'Audit log' };

const NO_FILTER = auditFilterSchema.parse({});

export default clubPage('audit.read', async ({ scope, search }) => {
  const { slug, name } = scope.club;
  const page = `/clubs/${slug}/club/audit`;
  const parsed = auditFilterSchema.safeParse(search);
  const filter = parsed.data ?? NO_FILTER;
  const errors = Object.fromEntries((parsed.error?.issues ?? []).map(({ path, message }) => [path.join('.'), message]));
  const found = await readAudit(scope, filter, Number(search.page ?? 1));
  const { lines, total, people, actions } = found;
  return (
    <>
      <PageTitle
        title="Audit log"
        over={name}
        lead="Every change, by whom and when. Nobody can change or delete a row."
        actions={
          <a href={`/api/clubs/${slug}/audit${auditSearch(filter)}`} download className={buttonClasses('plain')}>
            Take out as CSV
          </a>
        }
      />
      {!parsed.success && (
        <Notice level="caution" title="This filter cannot be read, so all rows are shown" className="mb-4">
          {Object.values(errors).join(' ')}
        </Notice>
      )}
      <AuditFilters filter={filter} errors={errors} people={people} actions={actions} page={page} />
      {lines.length === 0 ? (
        <EmptyState title="Nothing was found">Widen the days, or clear the filter.</EmptyState>
      ) : (
        <>
          <AuditTable lines={lines} />
          <Pager
            page={found.page}
            pages={found.pages}
            hrefFor={(next) => `${page}${auditSearch(filter, next)}`}
            summary={`${total} ${total === 1 ? 'row' : 'rows'}, page ${found.page} of ${found.pages}`}
          />
        </>
      )}
    </>
  );
});
