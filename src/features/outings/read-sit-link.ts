import { type BoardState, boardState } from '@/core/outing/board-state';
import { hashSecret } from '@/lib/secrets';
import { systemScopeById } from '@/server/scope';
import { findContact } from './contacts-data';
import { findOuting } from './data';
import { findLiveLink } from './links-data';
import { outingFacts } from './outing-facts';
import { listSteps } from './overdue-data';
import { clockAndDay, STATE_WORDS } from './words/outing';
import { SIT_LINK_WORDS } from './words/overdue';

export interface SharedSit {
  clubName: string;
  memberName: string;
  state: BoardState;
  stateText: string;
  /** Empty once the person has signed out: nobody needs it then. */
  facts: { label: string; value: string }[];
  /** Only where the club's rule gives it. */
  place: { lat: number; lon: number } | null;
  /** 'Club officers were told at 7:45 PM, Sat 7 Nov.' */
  told: string[];
  /** The reader came by the mail to a safety contact, and may stop being one. */
  mayStop: boolean;
}

/** The page behind a secret address; null when it is unknown, too old or turned off. */
export async function readSitLink(secret: string, now: number): Promise<SharedSit | null> {
  const found = await findLiveLink(hashSecret(secret), now);
  if (!found) return null;
  const scope = await systemScopeById(found.link.clubId);
  const outing = await findOuting(scope, found.link.outingId);
  if (!outing) return null;
  const { club } = scope;
  const { backByMinutes, overdueShowsPlace } = club.rules;
  const state = boardState({ ...outing, outing, backByMinutes, now });
  const out = outing.signedOutAt !== null;
  const steps = out ? [] : (await listSteps([outing.id])).filter((row) => row.moves === outing.moves);
  const contact = found.link.kind === 'contact' ? await findContact(outing.userId) : null;
  return {
    clubName: club.name,
    memberName: outing.memberName,
    state,
    stateText:
      outing.signedOutAt === null
        ? STATE_WORDS[state]
        : SIT_LINK_WORDS.signedOut(clockAndDay(outing.signedOutAt, club)),
    facts: out ? [] : outingFacts(outing, club),
    place: overdueShowsPlace && !out ? { lat: outing.standLat, lon: outing.standLon } : null,
    told: steps
      .filter((row) => row.outcome === 'mailed')
      .map((row) => SIT_LINK_WORDS.told[row.step](clockAndDay(row.at, club))),
    mayStop: contact?.consentedAt != null,
  };
}
