import { write } from '@/db/client';
import { newId } from '@/lib/ids';
import type { ClubScope } from '@/server/scope';
import type { FeatureFormValues } from './feature-schema';
import { insertFeature, listFeatures } from './features-data';
import { noteChange } from './note-change';
import { refuseTakenName } from './refuse';
import { GROUND_AUDIT } from './words/audit';
import { TAKEN_NAMES } from './words/errors';

export function addFeature(
  scope: ClubScope,
  values: FeatureFormValues,
  now: number,
): Promise<{ id: string; name: string }> {
  const id = newId('feature');
  return write(async (tx) => {
    refuseTakenName(await listFeatures(scope, tx), values.name, TAKEN_NAMES.feature);
    await insertFeature(scope, tx, { ...values, id });
    const summary = GROUND_AUDIT.featureAdded(values.name);
    await noteChange(scope, tx, { subject: 'feature', verb: 'added', id, summary }, now);
    return { id, name: values.name };
  });
}
