import { FeaturesTable, ParkingsTable } from '@/features/ground/components/ground-tables';
import { readGround } from '@/features/ground/reads';
import { readMap } from '@/features/map/read-map';
import { GroundMap } from '@/features/moment/components/ground-map';
import { windowToPick } from '@/features/sits/reads';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { EmptyState } from '@/ui/notices';
import { PageTitle, Section } from '@/ui/page-parts';
import { saveDrawingAction } from './actions';

export const metadata = { title: 'Ground' };

export default clubPage('features.read', async ({ scope, search }) => {
  const at = now();
  const [{ features, parkings }, map] = await Promise.all([readGround(scope), readMap(scope, at)]);
  const { day, window } = windowToPick(at, scope.club);
  const base = `/clubs/${scope.club.slug}/ground`;
  const canWrite = scope.can('features.write');
  const addFeature = <ButtonLink href={`${base}/features/new`}>Add a feature</ButtonLink>;
  const addParking = <ButtonLink href={`${base}/parking/new`}>Add a parking place</ButtonLink>;
  return (
    <>
      <PageTitle
        title="Ground"
        lead="What deer use and where people leave their trucks: the ranking weighs both."
        actions={
          <>
            {canWrite && <ButtonLink href={`${base}/import`}>Bring in a file</ButtonLink>}
            {scope.can('ground.export') && <ButtonLink href={`${base}/export`}>Take it out</ButtonLink>}
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
      <Section title="Features" actions={canWrite && features.length > 0 && addFeature}>
        <FeaturesTable
          club={scope.club.slug}
          lines={features}
          empty={
            <EmptyState title="No features yet" action={canWrite && addFeature}>
              {canWrite
                ? 'Begin with bedding and food: scent and noise are weighed against them.'
                : 'A steward adds bedding, food, water and travel lines.'}
            </EmptyState>
          }
        />
      </Section>
      <Section title="Parking places" actions={canWrite && parkings.length > 0 && addParking}>
        <ParkingsTable
          club={scope.club.slug}
          lines={parkings}
          empty={
            <EmptyState title="No parking places yet" action={canWrite && addParking}>
              Approaches begin at a parking place{canWrite ? ': add one first.' : '; a steward adds them.'}
            </EmptyState>
          }
        />
      </Section>
    </>
  );
});
