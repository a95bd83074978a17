import { weaponWord } from '@/core/booking/seasons';
import type { Weapon } from '@/core/ground-types';
import type { SitGuest } from '@/db/schema';
import type { ClubScope } from '@/server/scope';
import type { SitDetail } from './data';
import { wayInText } from './sit-entry';
import { dayAndWindow, type SitWindows, spanText } from './words/sits';

/** A sit as screens show it; carries neither positions nor addresses. */
export interface SitView {
  id: string;
  sequence: number;
  status: SitDetail['status'];
  standId: string;
  standName: string;
  memberId: string;
  memberName: string;
  day: string;
  windows: SitWindows;
  /** 'Sat 7 Nov 2026, morning' */
  whenText: string;
  /** '6:05 AM to 11:00 AM', club time. */
  timeText: string;
  startAt: number;
  endAt: number;
  weapon: Weapon;
  weaponText: string;
  approachId: string | null;
  wayIn: string | null;
  guests: SitGuest[];
  note: string;
  cancelReason: string | null;
}

export function sitView(scope: ClubScope, sit: SitDetail): SitView {
  return {
    id: sit.id,
    sequence: sit.sequence,
    status: sit.status,
    standId: sit.standId,
    standName: sit.standName,
    memberId: sit.memberId,
    memberName: sit.memberName,
    day: sit.day,
    windows: sit.windows,
    whenText: dayAndWindow(sit.day, sit.windows, true),
    timeText: spanText(sit.startAt, sit.endAt, scope.club),
    startAt: sit.startAt,
    endAt: sit.endAt,
    weapon: sit.weapon,
    weaponText: weaponWord(sit.weapon),
    approachId: sit.approachId,
    wayIn: wayInText(sit),
    guests: sit.guests,
    note: sit.note,
    cancelReason: sit.cancelReason,
  };
}

/** What an action answers: enough to say what was done. */
export function savedSit(scope: ClubScope, sit: SitDetail) {
  const { id, sequence, status, standName, memberName, whenText, timeText } = sitView(scope, sit);
  return { sitId: id, sequence, status, standName, memberName, whenText, timeText };
}
export type SavedSit = ReturnType<typeof savedSit>;
