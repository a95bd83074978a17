import type { Metadata } from 'next';
import { auditFilterSchema, auditSearch } from '@/features/clubs/audit-schema';
import { AuditFilters } from '@/features/clubs/components/audit-filters';
import { AuditTable } from '@/features/clubs/components/audit-table';
import { readAudit } from '@/features/clubs/read-audit';
import { CLUB_AUDIT_PAGE_WORDS } from '@/features/clubs/words/pages';
import { clubPage } from '@/server/doors';
import { buttonClasses } from '@/ui/button';
import { EmptyState, Notice } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';
import { Pager } from '@/ui/pager';

export const metadata: Metadata = { title: CLUB_AUDIT_PAGE_WORDS.title };

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
        title={CLUB_AUDIT_PAGE_WORDS.title}
        over={name}
        lead={CLUB_AUDIT_PAGE_WORDS.lead}
        actions={
          <a href={`/api/clubs/${slug}/audit${auditSearch(filter)}`} download className={buttonClasses('plain')}>
            {CLUB_AUDIT_PAGE_WORDS.takeOut}
          </a>
        }
      />
      {!parsed.success && (
        <Notice level="caution" title={CLUB_AUDIT_PAGE_WORDS.badFilter} className="mb-4">
          {Object.values(errors).join(' ')}
        </Notice>
      )}
      <AuditFilters filter={filter} errors={errors} people={people} actions={actions} page={page} />
      {lines.length === 0 ? (
        <EmptyState title={CLUB_AUDIT_PAGE_WORDS.none}>{CLUB_AUDIT_PAGE_WORDS.noneText}</EmptyState>
      ) : (
        <>
          <AuditTable lines={lines} />
          <Pager
            page={found.page}
            pages={found.pages}
            hrefFor={(next) => `${page}${auditSearch(filter, next)}`}
            summary={CLUB_AUDIT_PAGE_WORDS.pages(total, found.page, found.pages)}
          />
        </>
      )}
    </>
  );
});
