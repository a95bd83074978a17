import { and, eq } from 'drizzle-orm';
import type { SetupSettings } from '@/core/setup-check/setup-settings';
import { type ReadFrom, reader, type Tx } from '@/db/client';
import { setupSettings } from '@/db/schema';
import type { ClubScope } from '@/server/scope';

export interface OwnSettings {
  own: Partial<SetupSettings>;
  /** 0: the club has none of its own yet. */
  version: number;
}

export async function getSetupSettings(scope: ClubScope, from: ReadFrom = reader()): Promise<OwnSettings> {
  const [row] = await from.select().from(setupSettings).where(eq(setupSettings.clubId, scope.club.id));
  return { own: row?.settings ?? {}, version: row?.version ?? 0 };
}

export async function putSetupSettings(scope: ClubScope, tx: Tx, { own, version }: OwnSettings): Promise<void> {
  const clubId = scope.club.id;
  if (version === 0) {
    await tx.insert(setupSettings).values({ clubId, settings: own, version: 1 });
    return;
  }
  const at = and(eq(setupSettings.clubId, clubId), eq(setupSettings.version, version));
  await tx
    .update(setupSettings)
    .set({ settings: own, version: version + 1 })
    .where(at);
}
