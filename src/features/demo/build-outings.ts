import type { MadeClub } from './build-club';
import type { MadeGround } from './build-ground';
import type { DemoRows } from './demo-rows';
import { type Dice, makeDice } from './dice';
import type { SitRow } from './sit-planner';

const MINUTE_MS = 60_000;
const ROUND_MS = 5 * MINUTE_MS;

/** Invented vehicles, one a member. */
const VEHICLES = [
  'grey pickup, dented tailgate',
  'green wagon, roof rack',
  'white van',
  'red pickup, dog box',
  'old tan jeep',
  'blue hatchback',
];

type OutingRow = DemoRows['outings'][number];

const roundUp = (at: number) => Math.ceil(at / ROUND_MS) * ROUND_MS;

function outingOf(dice: Dice, ground: MadeGround, sit: SitRow, vehicle: string, now: number): OutingRow {
  const signedInAt = sit.startAt - dice.whole(15, 50) * MINUTE_MS;
  const firstBackBy = roundUp(sit.endAt + 25 * MINUTE_MS);
  const tracking = dice.chance(0.05);
  const movedAt = sit.endAt - dice.whole(0, 30) * MINUTE_MS;
  const backBy = firstBackBy + (tracking ? 120 * MINUTE_MS : 0);
  const outAt = backBy - dice.whole(0, 20) * MINUTE_MS;
  const out = outAt <= now;
  const moved = tracking && movedAt <= now;
  return {
    id: dice.id('outing'),
    clubId: sit.clubId,
    sitId: sit.id,
    memberId: sit.memberId,
    approachId: sit.approachId ?? null,
    parkingId: ground.approaches.find(({ id }) => id === sit.approachId)?.parkingId ?? null,
    vehicle,
    signedInAt,
    signedInBy: sit.memberId,
    backBy: moved ? backBy : firstBackBy,
    firstBackBy,
    moves: moved ? 1 : 0,
    tracking: moved,
    lastSignAt: moved ? movedAt : signedInAt,
    signedOutAt: out ? outAt : null,
    signedOutBy: out ? sit.memberId : null,
  };
}

/** Who signed in and out this season; some forgot to. Whoever sits at this hour is on the ground. */
export function buildOutings(club: MadeClub, ground: MadeGround, sits: readonly SitRow[], now: number): OutingRow[] {
  const rows: OutingRow[] = [];
  for (const sit of sits) {
    const dice = makeDice(`outing ${sit.id}`);
    const forgot = sit.endAt <= now && dice.chance(0.08);
    if (sit.status !== 'booked' || sit.startAt > now || forgot) continue;
    const vehicle = VEHICLES[club.members.findIndex(({ id }) => id === sit.memberId) % VEHICLES.length] ?? '';
    const row = outingOf(dice, ground, sit, vehicle, now);
    const stillOut = rows.some((one) => one.memberId === row.memberId && one.signedOutAt === null);
    if (!(stillOut && row.signedOutAt === null)) rows.push(row);
  }
  return rows;
}

/** One member has named somebody at home, who has agreed. */
export function buildContacts(club: MadeClub): DemoRows['safetyContacts'] {
  const member = club.members.find(({ key }) => key === 'odalys');
  if (!member?.userId) return [];
  const at = club.row.createdAt;
  const secretHash = `demo ${member.userId}`;
  const person = { name: 'Milo Fenwick', email: 'milo@example.org' };
  return [{ ...person, userId: member.userId, secretHash, askedAt: at, expiresAt: at, consentedAt: at }];
}
