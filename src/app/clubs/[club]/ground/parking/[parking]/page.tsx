import { ParkingFormView } from '@/features/ground/components/parking-form';
import { RemoveButton } from '@/features/ground/components/remove-button';
import { formClubOf } from '@/features/ground/form-club';
import { parkingFormOf } from '@/features/ground/parking-schema';
import { getParking } from '@/features/ground/parkings-data';
import { degreesText } from '@/features/ground/place-text';
import { PARKING_PAGE_WORDS } from '@/features/ground/words/pages';
import { clubPage } from '@/server/doors';
import { notFound } from '@/server/errors';
import { DefinitionList, PageTitle } from '@/ui/page-parts';
import { addParkingAction, changeParkingAction, removeParkingAction } from '../../actions';

export const metadata = { title: PARKING_PAGE_WORDS.title };

export default clubPage('features.read', async ({ scope, params }) => {
  const parking = await getParking(scope, params.parking ?? '');
  if (!parking) throw notFound();
  const at = { id: parking.id, version: parking.version };
  const canWrite = scope.can('features.write');
  return (
    <>
      <PageTitle
        title={parking.name}
        over={PARKING_PAGE_WORDS.title}
        actions={
          canWrite && (
            <RemoveButton
              club={scope.club.slug}
              at={at}
              name={parking.name}
              remove={removeParkingAction}
              to={`/clubs/${scope.club.slug}/ground`}
            >
              <p>{PARKING_PAGE_WORDS.removeText}</p>
            </RemoveButton>
          )
        }
      />
      {canWrite ? (
        <ParkingFormView
          key={parking.version}
          club={scope.club.slug}
          formClub={formClubOf(scope.club)}
          values={parkingFormOf(parking)}
          at={at}
          add={addParkingAction}
          change={changeParkingAction}
        />
      ) : (
        <DefinitionList
          items={[
            {
              term: PARKING_PAGE_WORDS.latitudeLongitude,
              detail: `${degreesText(parking.lat)}, ${degreesText(parking.lon)}`,
            },
            { term: PARKING_PAGE_WORDS.notes, detail: parking.notes || '–' },
          ]}
        />
      )}
    </>
  );
});
