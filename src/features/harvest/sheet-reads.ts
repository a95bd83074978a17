import { randomUUID } from 'node:crypto';
import { dayOf, formatClock } from '@/core/day-time';
import { WEAPONS } from '@/core/types';
import { formatWeight, type Units } from '@/core/units';
import { findSit } from '@/features/bookings/data';
import { listStands } from '@/features/ground/stands-data';
import { isOwnSit, maySeeLog } from '@/features/logs/log-access';
import { findLoggable } from '@/features/logs/logs-data';
import { notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { mayChange, mayWriteFor } from './harvest-access';
import { emptyHarvestForm, type HarvestForm, harvestFormOf } from './harvest-schema';
import { AGE_METHOD_WORDS } from './harvest-words';
import { findSheet, listHunters, type Sheet } from './harvests-data';
import { lengthWords, sheetLine } from './sheet-line';

export interface HarvestFormChoices {
  hunters: { value: string; label: string }[];
  stands: { value: string; label: string }[];
  units: Units;
}

interface Kept {
  hunter: { id: string; name: string };
  stand: { id: string; name: string } | null;
}

/** What the form offers; `kept` stays on offer on a sheet that has it, though the person or stand has gone since. */
export async function readHarvestChoices(scope: ClubScope, kept?: Kept): Promise<HarvestFormChoices> {
  const me = scope.member.id;
  const hunters = (await listHunters(scope)).filter((hunter) => mayWriteFor(scope, hunter));
  const stands = (await listStands(scope)).map(({ id, name }) => ({ id, name }));
  if (kept && !hunters.some((one) => one.id === kept.hunter.id)) {
    hunters.push({ ...kept.hunter, role: 'member', sponsorId: null });
  }
  if (kept?.stand && !stands.some((one) => one.id === kept.stand?.id)) stands.push(kept.stand);
  return {
    hunters: hunters.map(({ id, name, role }) => ({
      value: id,
      label: id === me ? `${name} (you)` : role === 'guest' ? `${name} (guest)` : name,
    })),
    stands: stands.map(({ id, name }) => ({ value: id, label: name })),
    units: scope.club.units,
  };
}

/** A blank sheet, begun from a sit where its log leads here. */
export async function readNewHarvest(scope: ClubScope, sitId: string | null, now: number) {
  const { club, member } = scope;
  const loggable = sitId === null ? null : await findLoggable(scope, sitId);
  const mayUse = loggable && (isOwnSit(scope, loggable) || scope.can('harvest.write_any'));
  const sit = mayUse ? await findSit(scope, loggable.id) : null;
  const shotAt = loggable && maySeeLog(scope, loggable, now) ? (loggable.log?.shotAt ?? null) : null;
  const at = sit ? (shotAt ?? Math.min(sit.endAt, now)) : now;
  const form = emptyHarvestForm({
    requestKey: randomUUID(),
    hunterId: sit?.memberId ?? member.id,
    sitId: sit?.id ?? '',
    day: sit?.day ?? dayOf(at, club.zone),
    clock: formatClock(at, club.zone),
    standId: sit?.standId ?? '',
    weapon: sit?.weapon ?? WEAPONS[0],
  });
  return { form, choices: await readHarvestChoices(scope) };
}

export interface HarvestSheetView {
  id: string;
  version: number;
  title: string;
  facts: { term: string; detail: string }[];
  /** null: may be read and not changed. */
  change: { form: HarvestForm; choices: HarvestFormChoices } | null;
}

async function readChange(scope: ClubScope, { sheet, memberName, standName }: Sheet) {
  const { club } = scope;
  const hunter = { id: sheet.guestId ?? sheet.memberId, name: sheet.guestId === null ? memberName : sheet.guestName };
  const stand = sheet.standId === null ? null : { id: sheet.standId, name: standName ?? 'A stand' };
  return {
    form: harvestFormOf(sheet, formatClock(sheet.takenAt, club.zone), club.units),
    choices: await readHarvestChoices(scope, { hunter, stand }),
  };
}

/** One sheet, and its form for those who may change it. */
export async function readHarvestSheet(scope: ClubScope, id: string): Promise<HarvestSheetView> {
  const found = await findSheet(scope, id);
  if (!found) throw notFound();
  const { sheet } = found;
  const { club } = scope;
  const line = sheetLine(scope, found);
  const beam = (mm: number | null) => (mm === null ? '–' : lengthWords(mm, club.units));
  const method = sheet.ageMethod === null ? '' : ` (${AGE_METHOD_WORDS[sheet.ageMethod].toLowerCase()})`;
  const antlers = [
    { term: 'Antlers', detail: line.antlers || '–' },
    { term: 'Main beams, left and right', detail: `${beam(sheet.mainBeamLeftMm)}, ${beam(sheet.mainBeamRightMm)}` },
  ];
  const milk = sheet.lactating === null ? 'Not looked at' : sheet.lactating ? 'Yes' : 'No';
  return {
    id,
    version: sheet.version,
    title: line.deer,
    facts: [
      { term: 'Taken by', detail: line.hunter },
      { term: 'When', detail: line.whenText },
      { term: 'Where', detail: line.where || '–' },
      { term: 'Weapon', detail: line.weapon },
      { term: 'Age', detail: line.age === '' ? 'Not estimated' : line.age + method },
      { term: 'Dressed weight', detail: line.weight || '–' },
      { term: 'Live weight', detail: sheet.liveKg === null ? '–' : formatWeight(sheet.liveKg, club.units) },
      ...(sheet.antlered ? antlers : []),
      ...(sheet.sex === 'doe' ? [{ term: 'In milk', detail: milk }] : []),
      { term: 'Notes', detail: sheet.notes || '–' },
    ],
    change: mayChange(scope, found) ? await readChange(scope, found) : null,
  };
}
