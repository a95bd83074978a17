import { listSitsSince } from '@/features/bookings/data';
import { listMembers } from '@/features/clubs/data';
import { listInvitations } from '@/features/clubs/invitations-data';
import { listApproaches } from '@/features/ground/approaches-data';
import { listStands } from '@/features/ground/stands-data';
import type { ClubScope } from '@/server/scope';
import { listSamples, stepsAreHidden } from './data';

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
      title: 'The place',
      why: 'Sun, forecast and clock are those of this point.',
      done: true,
      href: `${club}/club/place`,
      doing: 'Look at it',
    },
    {
      title: 'The first stand',
      why: 'Where it stands, how high, and how far a shot carries.',
      done: stands.length > 0,
      href: `${club}/stands/new`,
      doing: 'Add a stand',
    },
    {
      title: 'Its good winds',
      why: 'The directions a wind may come from there. Without them every wind counts the same.',
      done: stands.some(({ arcs }) => arcs.length > 0),
      href: first ? `${first}/edit` : `${club}/stands/new`,
      doing: 'Set the winds',
    },
    {
      title: 'A way in',
      why: 'From the gate to the stand: your scent drifts along it, and the list says when to leave.',
      done: ways.length > 0,
      href: first ? `${first}/approaches/new` : `${club}/stands/new`,
      doing: 'Draw a way in',
    },
    {
      title: 'The others',
      why: 'A stand is booked for all only when all book here.',
      done: others,
      href: `${club}/club/members/invite`,
      doing: 'Invite a member',
    },
    {
      title: 'The first sit',
      why: 'Take the first of the list, and the rest see that it is taken.',
      done: sits.length > 0,
      href: `${club}/sit`,
      doing: 'Look at the list',
    },
  ];
  return samples.size === 0 && steps.every(({ done }) => done) ? null : { steps, samples: samples.size > 0 };
}
