import { listSitsSince } from '@/features/bookings/data';
import { listMembers } from '@/features/clubs/data';
import { listInvitations } from '@/features/clubs/invitations-data';
import { listApproaches } from '@/features/ground/approaches-data';
import { listStands } from '@/features/ground/stands-data';
import type { ClubScope } from '@/server/scope';
import { listSamples, stepsAreHidden } from './data';
import { FIRST_STEPS } from './words';

export interface FirstStep {
  title: string;
  why: string;
  done: boolean;
  href: string;
  /** What the link to it says. */
  doing: string;
}

export interface FirstSteps {
  steps: FirstStep[];
  /** Sample stands lie on the ground. */
  samples: boolean;
}

const EARLIEST = '2000-01-01';

/** What a new club has still to do, for its admins; null: all is done, put away, or not this reader's to do. Samples count for nothing. */
export async function readFirstSteps(scope: ClubScope): Promise<FirstSteps | null> {
  if (!scope.can('rules.write')) return null;
  const samples = new Set((await listSamples(scope)).map(({ id }) => id));
  if (samples.size === 0 && (await stepsAreHidden(scope))) return null;
  const stands = (await listStands(scope)).filter(({ id }) => !samples.has(id));
  const own = new Set(stands.map(({ id }) => id));
  const ways = (await listApproaches(scope)).filter(({ standId }) => own.has(standId));
  const sits = (await listSitsSince(scope, EARLIEST, null)).filter(({ standId }) => own.has(standId));
  const others = (await listMembers(scope)).length > 1 || (await listInvitations(scope)).length > 0;
  const club = `/clubs/${scope.club.slug}`;
  const first = stands[0] ? `${club}/stands/${stands[0].id}` : null;
  const steps: FirstStep[] = [
    {
      title: FIRST_STEPS.place,
      why: FIRST_STEPS.placeWhy,
      done: true,
      href: `${club}/club/place`,
      doing: FIRST_STEPS.placeDoing,
    },
    {
      title: FIRST_STEPS.stand,
      why: FIRST_STEPS.standWhy,
      done: stands.length > 0,
      href: `${club}/stands/new`,
      doing: FIRST_STEPS.standDoing,
    },
    {
      title: FIRST_STEPS.winds,
      why: FIRST_STEPS.windsWhy,
      done: stands.some(({ arcs }) => arcs.length > 0),
      href: first ? `${first}/edit` : `${club}/stands/new`,
      doing: FIRST_STEPS.windsDoing,
    },
    {
      title: FIRST_STEPS.way,
      why: FIRST_STEPS.wayWhy,
      done: ways.length > 0,
      href: first ? `${first}/approaches/new` : `${club}/stands/new`,
      doing: FIRST_STEPS.wayDoing,
    },
    {
      title: FIRST_STEPS.others,
      why: FIRST_STEPS.othersWhy,
      done: others,
      href: `${club}/club/members/invite`,
      doing: FIRST_STEPS.othersDoing,
    },
    {
      title: FIRST_STEPS.sit,
      why: FIRST_STEPS.sitWhy,
      done: sits.length > 0,
      href: `${club}/sit`,
      doing: FIRST_STEPS.sitDoing,
    },
  ];
  return samples.size === 0 && steps.every(({ done }) => done) ? null : { steps, samples: samples.size > 0 };
}
