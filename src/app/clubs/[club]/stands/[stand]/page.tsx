import { RemoveButton } from '@/features/ground/components/remove-button';
import { StandApproaches } from '@/features/ground/components/stand-approaches';
import { GoodWinds, StandFacts } from '@/features/ground/components/stand-facts';
import { formClubOf } from '@/features/ground/form-club';
import { readStand } from '@/features/ground/reads';
import { namedSits } from '@/features/ground/refuse';
import { STAND_KIND_WORDS } from '@/features/ground/words';
import { SmallMap } from '@/features/map/components/small-map';
import { PhotoSection } from '@/features/photos/components/photo-section';
import { readPhotos } from '@/features/photos/read-photos';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { Notice } from '@/ui/notices';
import { PageTitle, Section } from '@/ui/page-parts';
import { captionPhotoAction, removePhotoAction } from '../../photos/actions';
import { removeStandAction } from '../actions';
import { removeApproachAction } from './approaches/actions';

export const metadata = { title: 'Stand' };

export default clubPage('stands.read', async ({ scope, params }) => {
  const { stand, approaches, parkings, closures, allowedNames, sits } = await readStand(
    scope,
    params.stand ?? '',
    now(),
  );
  const base = `/clubs/${scope.club.slug}`;
  const canWrite = scope.can('stands.write');
  return (
    <>
      <PageTitle
        over={STAND_KIND_WORDS[stand.kind]}
        title={stand.name}
        actions={
          canWrite && (
            <>
              <ButtonLink href={`${base}/stands/${stand.id}/edit`}>Edit</ButtonLink>
              <ButtonLink href={`${base}/closures?stand=${stand.id}`}>Close</ButtonLink>
              <RemoveButton
                club={scope.club.slug}
                at={{ id: stand.id, version: stand.version }}
                name={stand.name}
                remove={removeStandAction}
                to={`${base}/stands`}
              >
                <p>Its approaches and closures go with it. Past sits stay on record.</p>
                {sits.length > 0 && (
                  <p className="mt-2">It is booked: {namedSits(sits)}. Cancel or move these sits first.</p>
                )}
              </RemoveButton>
            </>
          )
        }
      />
      {closures.map((closure) => (
        <Notice key={closure.id} level="caution" title="Closed" className="mb-4">
          {closure.days}: {closure.reason}.
        </Notice>
      ))}
      <GoodWinds stand={stand} />
      <StandFacts
        stand={stand}
        units={scope.club.units}
        restDaysDefault={scope.club.rules.restDaysDefault}
        allowedNames={allowedNames}
      />
      {scope.can('features.read') && (
        <Section
          title="Map"
          actions={
            canWrite && <ButtonLink href={`${base}/ground?select=${stand.id}`}>Draw on the club's map</ButtonLink>
          }
        >
          <SmallMap club={scope.club.slug} standId={stand.id} />
        </Section>
      )}
      <StandApproaches
        club={scope.club.slug}
        formClub={formClubOf(scope.club)}
        standId={stand.id}
        approaches={approaches}
        parkings={parkings}
        canWrite={scope.can('approaches.write')}
        remove={removeApproachAction}
      />
      {stand.notes !== '' && (
        <Section title="Notes">
          <p className="max-w-prose whitespace-pre-line">{stand.notes}</p>
        </Section>
      )}
      <PhotoSection
        club={scope.club.slug}
        view={await readPhotos(scope, { subject: 'stand', id: stand.id }, now())}
        caption={captionPhotoAction}
        remove={removePhotoAction}
      />
    </>
  );
});
