import { updateApproach, updateFeature, updateMapItem } from '@/features/ground/data';
import { noteChange } from '@/features/ground/note-change';
import { removeParkingIn } from '@/features/ground/remove-parking';
import { removeStandIn } from '@/features/ground/remove-stand';
import type { DrawingChange } from './drawing-schema';
import type { Saving } from './set-drawn';
import { MAP_AUDIT } from './words/audit';
import { LAYER_WORDS } from './words/things';

/** Takes a thing off the map. What is gone already stays gone. */
export async function removeDrawn(saving: Saving, change: Extract<DrawingChange, { op: 'remove' }>): Promise<void> {
  const { scope, tx, rows, now } = saving;
  const { id, version } = change;
  const at = { id, version };
  switch (change.kind) {
    case 'stand':
      if (rows.stands.some((row) => row.id === id)) await removeStandIn(scope, tx, at, now);
      return;
    case 'parking':
      if (rows.parkings.some((row) => row.id === id)) await removeParkingIn(scope, tx, at, now);
      return;
    case 'approach': {
      const row = await updateApproach(scope, tx, at, { removedAt: now });
      if (!row) return;
      const stand = rows.stands.find((one) => one.id === row.standId)?.name;
      const summary = MAP_AUDIT.approachRemoved(row.name, stand);
      return noteChange(scope, tx, { subject: 'approach', verb: 'removed', id, summary }, now);
    }
    case 'feature': {
      const row = await updateFeature(scope, tx, at, { removedAt: now });
      if (!row) return;
      return noteChange(
        scope,
        tx,
        { subject: 'feature', verb: 'removed', id, summary: MAP_AUDIT.featureRemoved(row.name) },
        now,
      );
    }
    case 'item': {
      const row = await updateMapItem(scope, tx, at, { removedAt: now });
      if (!row) return;
      const summary = MAP_AUDIT.itemRemoved(LAYER_WORDS[row.layer], row.name);
      return noteChange(scope, tx, { subject: 'map_item', verb: 'removed', id, summary }, now);
    }
  }
}
