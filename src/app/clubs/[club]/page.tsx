import { redirect } from 'next/navigation';
import { clubPage } from '@/server/doors';

/** A club opens on what its person comes for. */
export default clubPage('club.read', async ({ scope }) =>
  redirect(`/clubs/${scope.club.slug}/${scope.can('sits.read') ? 'sit' : 'board'}`),
);
