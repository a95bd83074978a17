import type { Metadata } from 'next';
import { PlaceForm } from '@/features/clubs/components/place-form';
import { CLUB_PLACE_PAGE_WORDS } from '@/features/clubs/words/pages';
import { clubPage } from '@/server/doors';
import { PageTitle } from '@/ui/page-parts';
import { savePlaceAction } from './actions';

export const metadata: Metadata = { title: CLUB_PLACE_PAGE_WORDS.title };

export default clubPage('rules.write', async ({ scope }) => {
  const { slug, name, lat, lon, zone, clubUnits: units, version } = scope.club;
  return (
    <>
      <PageTitle title={CLUB_PLACE_PAGE_WORDS.title} over={name} lead={CLUB_PLACE_PAGE_WORDS.lead} />
      <PlaceForm
        club={slug}
        place={{ name, lat: String(lat), lon: String(lon), zone, units, version }}
        zones={Intl.supportedValuesOf('timeZone')}
        action={savePlaceAction}
      />
    </>
  );
});
