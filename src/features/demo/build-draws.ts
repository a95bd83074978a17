import { addDays } from '@/core/day-time';
import { DEFAULT_POINT_RULES } from '@/core/draw/points';
import type { MadeClub } from './build-club';
import type { MadeGround } from './build-ground';
import { type DemoDay, daysFrom, momentOf } from './demo-day';
import type { DemoRows } from './demo-rows';

/** A draw for the weekend everybody wants, with the wishes that have come in so far. */
export function buildDraws(day: DemoDay, club: MadeClub, ground: MadeGround): Pick<DemoRows, 'draws' | 'drawEntries'> {
  const clubId = club.row.id;
  const standIds = ground.stands.slice(0, 8).map((stand) => stand.id);
  const members = club.members.filter(({ role }) => role === 'member' || role === 'steward');
  const ahead = [11, 12, 13, 14, 15, 16, 17].map((n) => daysFrom(day, n));
  const saturday = ahead.find((one) => new Date(`${one}T12:00Z`).getUTCDay() === 6) ?? daysFrom(day, 11);
  const opened = momentOf(day, -2, '20:15');
  const draw = {
    id: day.dice.id('draw'),
    clubId,
    day: saturday,
    slots: [
      { day: saturday, windows: 'morning' as const },
      { day: saturday, windows: 'evening' as const },
      { day: addDays(saturday, 1), windows: 'morning' as const },
    ],
    standIds,
    closesAt: momentOf(day, 10, '17:00'),
    pointRules: DEFAULT_POINT_RULES,
    seed: day.dice.requestKey(),
    note: 'Opening weekend of the busy fortnight. Rank three or more.',
    state: 'open' as const,
    createdBy: club.members.find(({ role }) => role === 'admin')?.id ?? '',
    createdAt: opened,
  };
  const drawEntries = members.slice(1, 6).map((member, index) => ({
    drawId: draw.id,
    clubId,
    memberId: member.id,
    weapon: 'bow' as const,
    slots: index === 3 ? [0] : [0, 1, 2],
    choices: day.dice.shuffle(standIds).slice(0, 3),
    anyByScore: index % 2 === 0,
    at: opened + (index + 1) * 3_600_000,
  }));
  return { draws: [draw], drawEntries };
}
