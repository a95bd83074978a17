import { write } from '@/db/client';
import { notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import type { FeatureFormValues } from './feature-schema';
import { getFeature, listFeatures, updateFeature } from './features-data';
import { noteChange } from './note-change';
import { changedSince, changes, refuseTakenName } from './refuse';
import { GROUND_AUDIT } from './words/audit';
import { TAKEN_NAMES } from './words/errors';

export function changeFeature(
  scope: ClubScope,
  at: { id: string; version: number },
  values: FeatureFormValues,
  now: number,
): Promise<{ id: string; name: string }> {
  return write(async (tx) => {
    const before = await getFeature(scope, at.id, tx);
    if (!before) throw notFound();
    refuseTakenName(await listFeatures(scope, tx), values.name, TAKEN_NAMES.feature, at.id);
    if (!(await updateFeature(scope, tx, at, values))) throw await changedSince(scope, before, tx);
    const detail = changes(before, values);
    const summary = GROUND_AUDIT.featureChanged(values.name);
    await noteChange(scope, tx, { subject: 'feature', verb: 'changed', id: at.id, summary, detail }, now);
    return { id: at.id, name: values.name };
  });
}
