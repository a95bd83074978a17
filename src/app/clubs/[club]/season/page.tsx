import { redirect } from 'next/navigation';
import { SEASON_WORDS } from '@/features/logs/words/sightings';
import { clubPage } from '@/server/doors';

export const metadata = { title: SEASON_WORDS.title };

export default clubPage('log.read', async ({ scope }) => redirect(`/clubs/${scope.club.slug}/season/sightings`));
