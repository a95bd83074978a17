import { write } from '@/db/client';
import { notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { getFeature, updateFeature } from './features-data';
import { noteChange } from './note-change';
import { changedSince } from './refuse';
import { GROUND_AUDIT } from './words/audit';

export function removeFeature(
  scope: ClubScope,
  at: { id: string; version: number },
  now: number,
): Promise<{ name: string }> {
  return write(async (tx) => {
    const feature = await getFeature(scope, at.id, tx);
    if (!feature) throw notFound();
    if (!(await updateFeature(scope, tx, at, { removedAt: now }))) throw await changedSince(scope, feature, tx);
    const summary = GROUND_AUDIT.featureRemoved(feature.name);
    await noteChange(scope, tx, { subject: 'feature', verb: 'removed', id: at.id, summary }, now);
    return { name: feature.name };
  });
}
