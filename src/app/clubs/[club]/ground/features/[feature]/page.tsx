import { dayOf } from '@/core/day-time';
import { cropYearOf } from '@/core/map-layers';
import { FeatureFormView } from '@/features/ground/components/feature-form';
import { RemoveButton } from '@/features/ground/components/remove-button';
import { featureFormOf } from '@/features/ground/feature-schema';
import { getFeature } from '@/features/ground/features-data';
import { formClubOf } from '@/features/ground/form-club';
import { geometryText } from '@/features/ground/geometry-text';
import { formatSize } from '@/features/ground/view';
import { FEATURE_KIND_WORDS, formatMonths, SHAPE_WORDS } from '@/features/ground/words/kinds';
import { FEATURE_PAGE_WORDS } from '@/features/ground/words/pages';
import { PhotoSection } from '@/features/photos/components/photo-section';
import { readPhotos } from '@/features/photos/read-photos';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { notFound } from '@/server/errors';
import { DefinitionList, PageTitle } from '@/ui/page-parts';
import { captionPhotoAction, removePhotoAction } from '../../../photos/actions';
import { addFeatureAction, changeFeatureAction, removeFeatureAction } from '../../actions';

export const metadata = { title: FEATURE_PAGE_WORDS.title };

export default clubPage('features.read', async ({ scope, params }) => {
  const feature = await getFeature(scope, params.feature ?? '');
  if (!feature) throw notFound();
  const at = { id: feature.id, version: feature.version };
  const canWrite = scope.can('features.write');
  const year = cropYearOf(dayOf(now(), scope.club.zone));
  const { shape, text } = geometryText(feature.geometry);
  return (
    <>
      <PageTitle
        title={feature.name}
        over={FEATURE_KIND_WORDS[feature.kind]}
        actions={
          canWrite && (
            <RemoveButton
              club={scope.club.slug}
              at={at}
              name={feature.name}
              remove={removeFeatureAction}
              to={`/clubs/${scope.club.slug}/ground`}
            >
              <p>{FEATURE_PAGE_WORDS.removeText}</p>
            </RemoveButton>
          )
        }
      />
      {canWrite ? (
        <FeatureFormView
          key={feature.version}
          club={scope.club.slug}
          formClub={formClubOf(scope.club)}
          values={featureFormOf(feature)}
          year={year}
          at={at}
          add={addFeatureAction}
          change={changeFeatureAction}
        />
      ) : (
        <DefinitionList
          items={[
            { term: FEATURE_PAGE_WORDS.drawnAs, detail: SHAPE_WORDS[shape] },
            {
              term: FEATURE_PAGE_WORDS.size,
              detail: formatSize(feature.geometry, scope.club, scope.club.units) || '–',
            },
            { term: FEATURE_PAGE_WORDS.months, detail: formatMonths(feature.months) },
            ...feature.rotation.map((one) => ({
              term: FEATURE_PAGE_WORDS.cropOf(one.year),
              detail: `${one.crop}, ${formatMonths(one.months)}`,
            })),
            { term: FEATURE_PAGE_WORDS.latitudeLongitude, detail: <span className="whitespace-pre-line">{text}</span> },
            { term: FEATURE_PAGE_WORDS.notes, detail: feature.notes || '–' },
          ]}
        />
      )}
      <PhotoSection
        club={scope.club.slug}
        view={await readPhotos(scope, { subject: 'feature', id: feature.id }, now())}
        caption={captionPhotoAction}
        remove={removePhotoAction}
      />
    </>
  );
});
