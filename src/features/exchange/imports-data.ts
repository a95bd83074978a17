import { and, desc, eq, lt } from 'drizzle-orm';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { imports, memberships, users } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export type ImportRow = typeof imports.$inferSelect;

const own = (scope: ClubScope) => eq(imports.clubId, scope.club.id);

export async function getImport(scope: ClubScope, id: string, from: ReadFrom = reader()): Promise<ImportRow | null> {
  const [row] = await from
    .select()
    .from(imports)
    .where(and(own(scope), eq(imports.id, id)));
  return row ?? null;
}

export type ImportLine = Pick<ImportRow, 'id' | 'fileName' | 'state' | 'createdAt' | 'made'> & { memberName: string };

const MOST_LISTED = 20;

/** The latest files, without what was read of them. */
export function listImports(scope: ClubScope, from: ReadFrom = reader()): Promise<ImportLine[]> {
  return from
    .select({
      id: imports.id,
      fileName: imports.fileName,
      state: imports.state,
      createdAt: imports.createdAt,
      made: imports.made,
      memberName: users.name,
    })
    .from(imports)
    .innerJoin(memberships, eq(memberships.id, imports.memberId))
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(own(scope))
    .orderBy(desc(imports.createdAt), desc(imports.id))
    .limit(MOST_LISTED);
}

export async function insertImport(
  scope: ClubScope,
  tx: Tx,
  row: Pick<ImportRow, 'id' | 'fileName' | 'format' | 'things' | 'remarks' | 'createdAt'>,
): Promise<void> {
  await tx.insert(imports).values({ ...row, clubId: scope.club.id, memberId: scope.member.id, state: 'read' });
}

/** Saves over the version that was read; null when another save came between. */
export async function updateImport(
  scope: ClubScope,
  tx: Tx,
  at: { id: string; version: number },
  set: Partial<Pick<ImportRow, 'state' | 'swapped' | 'made' | 'savedAt' | 'undoneAt'>>,
): Promise<ImportRow | null> {
  const [row] = await tx
    .update(imports)
    .set({ ...set, version: at.version + 1 })
    .where(and(own(scope), eq(imports.id, at.id), eq(imports.version, at.version)))
    .returning();
  return row ?? null;
}

/** Files of all clubs that nobody took anything from. */
export async function deleteOldImports(tx: Tx, before: number): Promise<void> {
  await tx.delete(imports).where(and(eq(imports.state, 'read'), lt(imports.createdAt, before)));
}
