import { addDays, dayOf } from '@/core/day-time';
import { judgeTurn } from '@/core/notices/wind-turned';
import { write } from '@/db/client';
import { listClubs } from '@/db/queries/memberships';
import { env } from '@/env';
import { listBookedSits, type SitDetail } from '@/features/bookings/data';
import { dayAndWindow, spanText } from '@/features/bookings/words/sits';
import { getForecast, type KeptForecast } from '@/features/weather/get-forecast';
import { type ClubScope, systemScopeById } from '@/server/scope';
import { listNoticePeople, type NoticePerson } from './choices-data';
import { type Alternative, findAlternatives, judgeSit, type SitWorth, worthOf } from './judge-sits';
import { findOutlook, listOutlooks, type OutlookRow, putOutlook } from './outlooks-data';
import { type NoticeMail, queueNotice, wanting } from './queue-notice';
import { WIND_TURNED_MAIL } from './words/mails';
import { worthText } from './words/worth';

/** A forecast further ahead is still guesswork. Our choice. */
const DAYS_AHEAD = 7;
/** Most leave the truck about then: quiet hours hold nothing longer. */
const BEFORE_START_MS = 2 * 3_600_000;

export type ForecastOf = (scope: ClubScope, now: number) => Promise<KeptForecast>;

const keptForecast: ForecastOf = ({ club: { lat, lon } }, now) => getForecast({ lat, lon }, now);

const aboutOf = (sit: SitDetail) => `${sit.standId} ${sit.day} ${sit.windows}`;

function mailOf(
  scope: ClubScope,
  sit: SitDetail,
  before: OutlookRow,
  after: SitWorth,
  best: Alternative | null,
): NoticeMail {
  const { club } = scope;
  const words = WIND_TURNED_MAIL;
  const when = dayAndWindow(sit.day, sit.windows, true);
  return {
    kind: 'wind_turned',
    dedupeKey: `notice.wind_turned:${sit.id}:${before.told + 1}`,
    subject: words.subject(sit.standName, dayAndWindow(sit.day, sit.windows)),
    paragraphs: [words.opening(sit.standName)],
    facts: [
      { label: words.sit, value: words.sitOf(when, spanText(sit.startAt, sit.endAt, club)) },
      { label: words.before, value: worthText(before) },
      { label: words.now, value: worthText(after) },
      {
        label: words.best,
        value: best ? words.bestOf(best.name, worthText(best)) : words.noBest,
      },
    ],
    button: {
      label: words.button(best?.name ?? null),
      url: `${env.appUrl}/clubs/${club.slug}/notices/swap/${sit.id}`,
    },
    after: [words.after],
    latest: sit.startAt - BEFORE_START_MS,
  };
}

/** Looks at one sit; true when its member was told. Another process that was quicker leaves nothing to do. */
async function lookAt(
  scope: ClubScope,
  look: { sit: SitDetail; seen: OutlookRow | null; person: NoticePerson | undefined; kept: KeptForecast },
  now: number,
): Promise<boolean> {
  const { sit, seen, person, kept } = look;
  const after = worthOf(await judgeSit(scope, sit, kept, now));
  if (!after) return false;
  const forecastAt = kept.forecast?.fetchedAt ?? null;
  const moved = seen !== null && seen.about !== aboutOf(sit);
  const turn = seen && !moved ? judgeTurn(seen, after, person?.choices.windPoints ?? 15) : 'better';
  const tells = turn === 'worse' && seen !== null && person !== undefined;
  const [best = null] = tells ? await findAlternatives(scope, sit, after.quiet, kept, now) : [];
  return write(async (tx) => {
    const current = await findOutlook(scope, sit.id, tx);
    if ((current?.updatedAt ?? null) !== (seen?.updatedAt ?? null)) return false;
    const keeps = turn === 'same' && current !== null;
    await putOutlook(tx, {
      sitId: sit.id,
      clubId: scope.club.id,
      about: aboutOf(sit),
      quiet: keeps ? current.quiet : after.quiet,
      hold: keeps ? current.hold : after.hold,
      windFromDeg: keeps ? current.windFromDeg : after.windFromDeg,
      forecastAt,
      told: (current?.told ?? 0) + (turn === 'worse' ? 1 : 0),
      updatedAt: Math.max(now, (current?.updatedAt ?? 0) + 1),
    });
    return tells && current ? queueNotice(tx, scope, person, mailOf(scope, sit, current, after, best), now) : false;
  });
}

/**
 * Holds every booked sit of the coming week against each newer forecast, and tells its member once for each turn for the
 * worse. What was thought before is what was thought when it was booked, or when the member was last told.
 */
export async function tellWindTurned(now: number, forecastOf: ForecastOf = keptForecast): Promise<{ told: number }> {
  let told = 0;
  for (const club of await listClubs()) {
    const scope = await systemScopeById(club.id);
    const today = dayOf(now, club.zone);
    const booked = await listBookedSits(scope, { fromDay: today, toDay: addDays(today, DAYS_AHEAD) });
    const coming = booked.filter((sit) => sit.startAt > now);
    if (coming.length === 0) continue;
    const kept = await forecastOf(scope, now);
    const outlooks = await listOutlooks(scope);
    const forecastAt = kept.forecast?.fetchedAt ?? null;
    const people = wanting(await listNoticePeople(scope), 'wind_turned', today);
    for (const sit of coming) {
      const seen = outlooks.get(sit.id) ?? null;
      const newer = forecastAt !== null && forecastAt > (seen?.forecastAt ?? 0);
      if (seen && seen.about === aboutOf(sit) && !newer) continue;
      const person = people.find(({ memberId }) => memberId === sit.memberId);
      if (await lookAt(scope, { sit, seen, person, kept }, now)) told += 1;
    }
  }
  return { told };
}
