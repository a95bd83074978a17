import type { Metadata } from 'next';
import { PlaceForm } from '@/features/clubs/components/place-form';
import { clubPage } from '@/server/doors';
import { PageTitle } from '@/ui/page-parts';
import { savePlaceAction } from './actions';

export const metadata: Metadata = { title: 'Name, place and units' };

export default clubPage('rules.write', async ({ scope }) => {
  const { slug, name, lat, lon, zone, clubUnits: units, version } = scope.club;
  return (
    <>
      <PageTitle
        title="Name, place and units"
        over={name}
        lead="Sits already booked keep their hours when the place or the time zone changes."
      />
      <PlaceForm
        club={slug}
        place={{ name, lat: String(lat), lon: String(lon), zone, units, version }}
        zones={Intl.supportedValuesOf('timeZone')}
        action={savePlaceAction}
      />
    </>
  );
});
