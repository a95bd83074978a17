import { dayOf } from '@/core/day-time';
import { buildAudit } from './build-audit';
import { buildClosures } from './build-closures';
import { buildClub, buildUsers } from './build-club';
import { buildDraws } from './build-draws';
import { buildGround } from './build-ground';
import { buildHarvests, buildLogVersions } from './build-harvests';
import { buildImports } from './build-imports';
import { buildLand } from './build-land';
import { buildLogs } from './build-logs';
import { buildContacts, buildOutings } from './build-outings';
import { buildPredictions } from './build-predictions';
import { buildSetupAnswers } from './build-setup-answers';
import { buildUpkeep } from './build-upkeep';
import { buildVisits } from './build-visits';
import { planComingSits } from './coming-sits';
import { DEMO_PLACE, DEMO_SLUG } from './demo-place';
import type { DemoRows } from './demo-rows';
import { demoRules } from './demo-rules';
import { makeDice } from './dice';
import { planPastSeason } from './past-season';
import { MEMBERS } from './people';
import { buildSecondClub } from './second-club';
import { claimsOf, makePlanner } from './sit-planner';

export { DEMO_SLUG };

/** The demo as rows. The same day gives the same rows, whatever the hour; only who is on the ground goes by the hour. */
export function buildDemo(now: number, passwordHash: string): DemoRows {
  const today = dayOf(now, DEMO_PLACE.zone);
  const day = { today, dice: makeDice(`demo ${today}`) };
  const users = buildUsers(day, passwordHash);
  const place = { slug: DEMO_SLUG, name: 'Tansy Fork Deer Club', ...DEMO_PLACE };
  const club = buildClub(day, { ...place, rules: demoRules(today) }, MEMBERS, users);
  const second = buildSecondClub(day, users);
  const ground = buildGround(day, club);
  const closures = buildClosures(day, club, ground);
  const planner = makePlanner(day, club, ground, closures);
  planPastSeason(day, club, ground, planner);
  planComingSits(day, club, ground, planner);
  const { sits } = planner;
  const sitLogs = buildLogs(day, ground, sits);
  const taken = { today, dice: makeDice(`harvest ${today}`) };
  const harvests = buildHarvests(taken, club, sitLogs, sits);
  const sitLogVersions = buildLogVersions(taken, sitLogs, sits);
  const { parkings, stands, approaches, features } = ground;
  const upkeep = buildUpkeep({ today, dice: makeDice(`upkeep ${today}`) }, club, ground, closures);
  const mapItems = buildLand({ today, dice: makeDice(`land ${today}`) }, club);
  return {
    users,
    clubs: [club.row, second.row],
    memberships: [...club.memberships, ...second.memberships],
    parkings,
    stands: [...stands, ...second.stands],
    closures,
    approaches,
    features,
    sits,
    claims: claimsOf(day, sits),
    outings: buildOutings(club, ground, sits, now),
    safetyContacts: buildContacts(club),
    sitLogs,
    sitPredictions: buildPredictions({ today, dice: makeDice(`predictions ${today}`) }, ground, sitLogs, sits),
    sitLogVersions,
    harvests,
    visits: buildVisits(day, club, ground),
    ...upkeep,
    ...buildDraws({ today, dice: makeDice(`draws ${today}`) }, club, ground),
    auditLog: [
      ...buildAudit(day, club, { ground, closures, sits }),
      ...buildAudit(day, second, { ground: { ...ground, stands: second.stands }, closures: [], sits: [] }),
    ],
    mapItems,
    setupAnswers: buildSetupAnswers(day, club, ground, { mapItems, chores: upkeep.chores }),
    imports: buildImports({ today, dice: makeDice(`imports ${today}`) }, club),
  };
}
