import { FeaturesTable, ParkingsTable } from '@/features/ground/components/ground-tables';
import { readGround } from '@/features/ground/reads';
import { GROUND_PAGE_WORDS } from '@/features/ground/words/pages';
import { readMap } from '@/features/map/read-map';
import { GroundMap } from '@/features/moment/components/ground-map';
import { windowToPick } from '@/features/sits/reads';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { EmptyState } from '@/ui/notices';
import { PageTitle, Section } from '@/ui/page-parts';
import { saveDrawingAction } from './actions';

export const metadata = { title: GROUND_PAGE_WORDS.title };

export default clubPage('features.read', async ({ scope, search }) => {
  const at = now();
  const [{ features, parkings }, map] = await Promise.all([readGround(scope), readMap(scope, at)]);
  const { day, window } = windowToPick(at, scope.club);
  const base = `/clubs/${scope.club.slug}/ground`;
  const canWrite = scope.can('features.write');
  const addFeature = <ButtonLink href={`${base}/features/new`}>{GROUND_PAGE_WORDS.addFeature}</ButtonLink>;
  const addParking = <ButtonLink href={`${base}/parking/new`}>{GROUND_PAGE_WORDS.addParking}</ButtonLink>;
  return (
    <>
      <PageTitle
        title={GROUND_PAGE_WORDS.title}
        lead={GROUND_PAGE_WORDS.lead}
        actions={
          <>
            {canWrite && <ButtonLink href={`${base}/import`}>{GROUND_PAGE_WORDS.bringFile}</ButtonLink>}
            {scope.can('ground.export') && (
              <ButtonLink href={`${base}/export`}>{GROUND_PAGE_WORDS.takeItOut}</ButtonLink>
            )}
          </>
        }
      />
      <GroundMap
        packed={JSON.stringify(map)}
        zone={scope.club.zone}
        save={saveDrawingAction}
        selectedId={typeof search.select === 'string' ? search.select : null}
        next={{ day, window }}
      />
      <Section title={GROUND_PAGE_WORDS.features} actions={canWrite && features.length > 0 && addFeature}>
        <FeaturesTable
          club={scope.club.slug}
          lines={features}
          empty={
            <EmptyState title={GROUND_PAGE_WORDS.noFeatures} action={canWrite && addFeature}>
              {canWrite ? GROUND_PAGE_WORDS.noFeaturesText : GROUND_PAGE_WORDS.noFeaturesTextAsk}
            </EmptyState>
          }
        />
      </Section>
      <Section title={GROUND_PAGE_WORDS.parkingPlaces} actions={canWrite && parkings.length > 0 && addParking}>
        <ParkingsTable
          club={scope.club.slug}
          lines={parkings}
          empty={
            <EmptyState title={GROUND_PAGE_WORDS.noParking} action={canWrite && addParking}>
              {canWrite ? GROUND_PAGE_WORDS.noParkingText : GROUND_PAGE_WORDS.noParkingTextAsk}
            </EmptyState>
          }
        />
      </Section>
    </>
  );
});
