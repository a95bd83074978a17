import { RemoveButton } from '@/features/ground/components/remove-button';
import { StandApproaches } from '@/features/ground/components/stand-approaches';
import { GoodWinds, StandFacts } from '@/features/ground/components/stand-facts';
import { formClubOf } from '@/features/ground/form-club';
import { readStand } from '@/features/ground/reads';
import { namedSits } from '@/features/ground/refuse';
import { STAND_KIND_WORDS } from '@/features/ground/words/kinds';
import { STAND_PAGE_WORDS } from '@/features/ground/words/pages';
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

export const metadata = { title: STAND_PAGE_WORDS.title };

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
              <ButtonLink href={`${base}/stands/${stand.id}/edit`}>{STAND_PAGE_WORDS.edit}</ButtonLink>
              <ButtonLink href={`${base}/closures?stand=${stand.id}`}>{STAND_PAGE_WORDS.close}</ButtonLink>
              <RemoveButton
                club={scope.club.slug}
                at={{ id: stand.id, version: stand.version }}
                name={stand.name}
                remove={removeStandAction}
                to={`${base}/stands`}
              >
                <p>{STAND_PAGE_WORDS.removeText}</p>
                {sits.length > 0 && <p className="mt-2">{STAND_PAGE_WORDS.booked(namedSits(sits))}</p>}
              </RemoveButton>
            </>
          )
        }
      />
      {closures.map((closure) => (
        <Notice key={closure.id} level="caution" title={STAND_PAGE_WORDS.closed} className="mb-4">
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
          title={STAND_PAGE_WORDS.map}
          actions={
            canWrite && <ButtonLink href={`${base}/ground?select=${stand.id}`}>{STAND_PAGE_WORDS.draw}</ButtonLink>
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
        <Section title={STAND_PAGE_WORDS.notes}>
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
