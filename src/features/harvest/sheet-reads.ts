import { randomUUID } from 'node:crypto';
import { dayOf, formatClock } from '@/core/day-time';
import { WEAPONS } from '@/core/ground-types';
import { formatWeight, type Units } from '@/core/units';
import { findSit } from '@/features/bookings/data';
import { listStands } from '@/features/ground/stands-data';
import { isOwnSit, maySeeLog } from '@/features/logs/log-access';
import { findLoggable } from '@/features/logs/logs-data';
import { notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { mayChange, mayWriteFor } from './harvest-access';
import { emptyHarvestForm, type HarvestForm, harvestFormOf } from './harvest-schema';
import { findSheet, listHunters, type Sheet } from './harvests-data';
import { sheetLine } from './sheet-line';
import { AGE_METHOD_WORDS } from './words/deer';
import { HUNTER_CHOICE, lengthWords, SHEET_WORDS } from './words/sheet';

const words = SHEET_WORDS;

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
      label: id === me ? HUNTER_CHOICE.you(name) : role === 'guest' ? HUNTER_CHOICE.guest(name) : name,
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
  const stand = sheet.standId === null ? null : { id: sheet.standId, name: standName ?? HUNTER_CHOICE.goneStand };
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
  const age = sheet.ageMethod === null ? line.age : words.ageBy(line.age, AGE_METHOD_WORDS[sheet.ageMethod]);
  const antlers = [
    { term: words.antlers, detail: line.antlers || '–' },
    { term: words.beams, detail: `${beam(sheet.mainBeamLeftMm)}, ${beam(sheet.mainBeamRightMm)}` },
  ];
  const milk = sheet.lactating === null ? words.notLookedAt : sheet.lactating ? words.yes : words.no;
  return {
    id,
    version: sheet.version,
    title: line.deer,
    facts: [
      { term: words.hunter, detail: line.hunter },
      { term: words.when, detail: line.whenText },
      { term: words.where, detail: line.where || '–' },
      { term: words.weapon, detail: line.weapon },
      { term: words.age, detail: line.age === '' ? words.notEstimated : age },
      { term: words.dressed, detail: line.weight || '–' },
      { term: words.live, detail: sheet.liveKg === null ? '–' : formatWeight(sheet.liveKg, club.units) },
      ...(sheet.antlered ? antlers : []),
      ...(sheet.sex === 'doe' ? [{ term: words.inMilk, detail: milk }] : []),
      { term: words.notes, detail: sheet.notes || '–' },
    ],
    change: mayChange(scope, found) ? await readChange(scope, found) : null,
  };
}
