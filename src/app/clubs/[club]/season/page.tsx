import { redirect } from 'next/navigation';
import { clubPage } from '@/server/doors';

export const metadata = { title: 'Season' };

export default clubPage('log.read', async ({ scope }) => redirect(`/clubs/${scope.club.slug}/season/sightings`));
