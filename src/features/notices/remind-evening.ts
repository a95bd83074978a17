import { legalLightRuleOf } from '@/core/booking/seasons';
import { addDays, dayOf, formatClock } from '@/core/day-time';
import { legalLight } from '@/core/legal-light';
import { sentence } from '@/core/sentence';
import { sunTimes } from '@/core/sun';
import type { ApproachOption, Verdict } from '@/core/verdict-types';
import { reader, write } from '@/db/client';
import { listClubs } from '@/db/queries/memberships';
import { env } from '@/env';
import { listBookedSits, type SitDetail } from '@/features/bookings/data';
import { clockText, dayAndWindow, spanText } from '@/features/bookings/words/sits';
import { hasMail } from '@/features/mail/data';
import { legalLightText, minutesText } from '@/features/sits/words/terms';
import { getForecast } from '@/features/weather/get-forecast';
import { type ClubScope, findScope, systemScopeById } from '@/server/scope';
import { listNoticePeople } from './choices-data';
import { judgeSit } from './judge-sits';
import { type NoticeMail, queueNotice, wanting } from './queue-notice';
import { EVENING_MAIL } from './words/mails';

/** The club's clock between which the evening's mail is made. Our choice. */
const FROM_CLOCK = '18:00';
const TO_CLOCK = '22:00';

const words = EVENING_MAIL;

const keyOf = (sit: SitDetail) => `notice.evening_before:${sit.id}:${sit.day}`;

/** By the way the member named, else by the best there is. */
function wayOf(sit: SitDetail, verdict: Verdict | undefined): ApproachOption | null {
  if (!verdict?.approach) return null;
  const all = [verdict.approach, ...verdict.approachAlternatives];
  return all.find(({ approachId }) => approachId === sit.approachId) ?? verdict.approach;
}

function factsOf(scope: ClubScope, sit: SitDetail, verdict: Verdict | undefined): { label: string; value: string }[] {
  const { club } = scope;
  const clock = (at: number) => clockText(at, club);
  const way = wayOf(sit, verdict);
  const sun = sunTimes(sit.day, club.zone, club.lat, club.lon);
  const rule = legalLightRuleOf(club.rules, sit.day, sit.weapon);
  const light = rule ? legalLight(rule, sit.day, club) : null;
  const from = way?.parkingName ?? sit.parkingName;
  return [
    { label: words.stand, value: sit.standName },
    {
      label: words.when,
      value: words.whenOf(dayAndWindow(sit.day, sit.windows, true), spanText(sit.startAt, sit.endAt, club)),
    },
    ...(way
      ? [
          { label: words.leaveBy, value: words.leaveByFrom(clock(way.leaveBy), from) },
          { label: words.wayIn, value: words.wayInOf(way.approachName, minutesText(way.walkSeconds), clock(way.inBy)) },
        ]
      : [{ label: words.wayIn, value: words.noWay }]),
    ...(verdict ? [{ label: words.wind, value: sentence({ ...verdict, gates: [], approach: way }, clock) }] : []),
    ...(sun.rise !== null && sun.set !== null
      ? [{ label: words.sun, value: words.sunOf(clock(sun.rise), clock(sun.set)) }]
      : []),
    ...(rule && light
      ? [{ label: words.light, value: words.lightOf(clock(light.startAt), clock(light.endAt), legalLightText(rule)) }]
      : []),
  ];
}

function mailOf(scope: ClubScope, sit: SitDetail, verdicts: Verdict[]): NoticeMail {
  const first = verdicts[0];
  const cautions = (first?.cautions ?? []).filter(({ level }) => level !== 'note').map(({ text }) => text);
  return {
    kind: 'evening_before',
    dedupeKey: keyOf(sit),
    subject: words.subject(sit.standName, dayAndWindow(sit.day, sit.windows)),
    paragraphs: [words.opening(sit.standName)],
    facts: factsOf(scope, sit, first),
    button: { label: words.button, url: `${env.appUrl}/clubs/${scope.club.slug}/my-sits` },
    after: [...cautions, words.safety],
  };
}

/** In the evening, tells each member who sits tomorrow when to leave, by which way, and in what wind: once a sit. */
export async function remindEvening(now: number): Promise<{ reminded: number }> {
  let reminded = 0;
  for (const club of await listClubs()) {
    const clock = formatClock(now, club.zone);
    if (clock < FROM_CLOCK || clock >= TO_CLOCK) continue;
    const scope = await systemScopeById(club.id);
    const today = dayOf(now, club.zone);
    const day = addDays(today, 1);
    const sits = await listBookedSits(scope, { fromDay: day, toDay: day });
    const known = await hasMail(sits.map(keyOf), reader());
    const people = wanting(await listNoticePeople(scope), 'evening_before', today);
    const kept = await getForecast(scope.club, now);
    for (const sit of sits.filter((one) => !known.has(keyOf(one)))) {
      const person = people.find(({ memberId }) => memberId === sit.memberId);
      // Through the member's own eyes: a guest is told no feature's name.
      const own = person && (await findScope(club.slug, person.userId));
      if (!person || !own) continue;
      const mail = mailOf(scope, sit, await judgeSit(own, sit, kept, now, 'full'));
      if (await write((tx) => queueNotice(tx, scope, person, mail, now))) reminded += 1;
    }
  }
  return { reminded };
}
