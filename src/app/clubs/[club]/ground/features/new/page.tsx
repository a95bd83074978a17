import { dayOf } from '@/core/day-time';
import { cropYearOf } from '@/core/map-layers';
import { FeatureFormView } from '@/features/ground/components/feature-form';
import { emptyFeatureForm } from '@/features/ground/feature-schema';
import { formClubOf } from '@/features/ground/form-club';
import { NEW_FEATURE_PAGE_WORDS } from '@/features/ground/words/pages';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { PageTitle } from '@/ui/page-parts';
import { addFeatureAction, changeFeatureAction } from '../../actions';

export const metadata = { title: NEW_FEATURE_PAGE_WORDS.title };

export default clubPage('features.write', async ({ scope }) => (
  <>
    <PageTitle title={NEW_FEATURE_PAGE_WORDS.title} over={NEW_FEATURE_PAGE_WORDS.ground} />
    <FeatureFormView
      club={scope.club.slug}
      formClub={formClubOf(scope.club)}
      values={emptyFeatureForm()}
      year={cropYearOf(dayOf(now(), scope.club.zone))}
      at={null}
      add={addFeatureAction}
      change={changeFeatureAction}
    />
  </>
));
