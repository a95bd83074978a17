import { LogFormView } from '@/features/logs/components/log-form';
import { LogHistory } from '@/features/logs/components/log-history';
import { readLog } from '@/features/logs/reads';
import { SIT_LOG_PAGE_WORDS } from '@/features/logs/words/screen';
import { PhotoSection } from '@/features/photos/components/photo-section';
import { readPhotos } from '@/features/photos/read-photos';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { PageTitle, Section } from '@/ui/page-parts';
import { captionPhotoAction, removePhotoAction } from '../../photos/actions';
import { saveLogAction } from '../actions';

const words = SIT_LOG_PAGE_WORDS;

export const metadata = { title: words.title };

export default clubPage('log.write', async ({ scope, params }) => {
  const { slug } = scope.club;
  const log = await readLog(scope, params.sit ?? '', now());
  const lines = [...(log.written ? [log.written] : []), ...log.history];
  const past = lines.length > 0 && (
    <Section title={log.history.length > 0 ? words.asSavedEachTime : words.asSaved} note={words.asSavedNote}>
      <LogHistory lines={lines} />
    </Section>
  );
  return (
    <>
      <PageTitle
        over={words.over(log.memberName, log.whenText)}
        title={log.standName}
        lead={words.lead(log.timeText)}
        actions={
          !log.form && (
            <ButtonLink look="quiet" href={`/clubs/${slug}/log`}>
              {words.back}
            </ButtonLink>
          )
        }
      />
      {log.form && (
        <LogFormView
          key={log.form.version}
          club={slug}
          values={log.form}
          day={log.day}
          zone={log.zone}
          units={log.units}
          harvest={scope.can('harvest.write')}
          save={saveLogAction}
        />
      )}
      {past}
      <PhotoSection
        club={slug}
        view={await readPhotos(scope, { subject: 'sit', id: params.sit ?? '' }, now())}
        caption={captionPhotoAction}
        remove={removePhotoAction}
      />
    </>
  );
});
