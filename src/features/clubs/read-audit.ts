import type { ClubScope } from '@/server/scope';
import { type AuditRow, countAudit, listAudit, listAuditActions, listAuditPeople } from './audit-data';
import type { AuditFilter } from './audit-schema';
import { actionWords, type DetailLine, detailLines, momentText } from './words/audit-text';

const ROWS_A_PAGE = 50;

export interface AuditLine {
  id: string;
  when: string;
  who: string;
  what: string;
  summary: string;
  details: DetailLine[];
}

export interface AuditPage {
  lines: AuditLine[];
  total: number;
  page: number;
  pages: number;
  people: { id: string; name: string }[];
  actions: { id: string; name: string }[];
}

function lineOf(scope: ClubScope, row: AuditRow): AuditLine {
  return {
    id: row.id,
    when: momentText(row.at, scope.club),
    who: row.actorName,
    what: actionWords(row.action),
    summary: row.summary,
    details: detailLines(row.detail),
  };
}

/** One page of what the filter finds, with what may be filtered by. A page past the end is the last. */
export async function readAudit(scope: ClubScope, filter: AuditFilter, asked: number): Promise<AuditPage> {
  const total = await countAudit(scope, filter);
  const pages = Math.max(1, Math.ceil(total / ROWS_A_PAGE));
  const page = Math.min(Math.max(1, Math.trunc(asked) || 1), pages);
  const rows = await listAudit(scope, filter, { most: ROWS_A_PAGE, skip: (page - 1) * ROWS_A_PAGE });
  const actions = await listAuditActions(scope);
  return {
    lines: rows.map((row) => lineOf(scope, row)),
    total,
    page,
    pages,
    people: await listAuditPeople(scope),
    actions: actions.map((id) => ({ id, name: actionWords(id) })),
  };
}
