import { DrawButton } from '@/features/draws/components/draw-button';
import { DrawResults } from '@/features/draws/components/draw-results';
import { EntryForm } from '@/features/draws/components/entry-form';
import { RunPanel } from '@/features/draws/components/run-panel';
import { readDraw } from '@/features/draws/reads';
import { DRAW_PAGE_WORDS as WORDS } from '@/features/draws/words/screens';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { Notice } from '@/ui/notices';
import { PageTitle, Section } from '@/ui/page-parts';
import {
  acceptSwapAction,
  cancelDrawAction,
  enterDrawAction,
  giveBackAction,
  leaveDrawAction,
  offerSwapAction,
  publishDrawAction,
  runDrawAction,
  stopDrawAction,
} from '../actions';

export const metadata = { title: WORDS.title };

export default clubPage('draws.enter', async ({ scope, params }) => {
  const { slug, name } = scope.club;
  const draw = await readDraw(scope, params.draw ?? '', now());
  const may = scope.can('draws.write');
  const atWork = draw.run?.atWork === true;
  const values = { drawId: draw.id };
  return (
    <>
      <PageTitle over={WORDS.over(name)} title={draw.title} lead={draw.stateText} />
      {draw.note !== '' && <p className="mb-4 max-w-2xl">{draw.note}</p>}
      {draw.state === 'cancelled' && <Notice>{WORDS.cancelled}</Notice>}
      {draw.mayEnter && (
        <Section title={WORDS.wishes} note={WORDS.yourPoints(draw.points)}>
          <EntryForm club={slug} draw={draw} enter={enterDrawAction} />
          {draw.hasEntered && (
            <div className="mt-4">
              <DrawButton
                club={slug}
                values={values}
                label={WORDS.leave}
                title={WORDS.leave}
                done={WORDS.left}
                look="quiet"
                act={leaveDrawAction}
              >
                {WORDS.leaveText}
              </DrawButton>
            </div>
          )}
        </Section>
      )}
      {may && (draw.state === 'open' || draw.state === 'drawn') && (
        <Section title={WORDS.admin}>
          <RunPanel key={draw.run?.id} club={slug} drawId={draw.id} initial={draw.run} stop={stopDrawAction} />
          {!atWork && (
            <div className="flex flex-wrap gap-3">
              {draw.state === 'drawn' && (
                <DrawButton
                  club={slug}
                  values={values}
                  label={WORDS.publish}
                  title={WORDS.publishTitle}
                  done={WORDS.published}
                  look="primary"
                  act={publishDrawAction}
                >
                  {WORDS.publishText}
                </DrawButton>
              )}
              {draw.mayMake && (
                <DrawButton
                  club={slug}
                  values={values}
                  label={draw.state === 'open' ? WORDS.make : WORDS.makeAgain}
                  title={WORDS.make}
                  done={WORDS.makeStarted}
                  look={draw.state === 'open' ? 'primary' : 'plain'}
                  act={runDrawAction}
                >
                  {WORDS.makeText}
                </DrawButton>
              )}
              <DrawButton
                club={slug}
                values={values}
                label={WORDS.callOff}
                title={WORDS.callOffTitle}
                done={WORDS.calledOff}
                look="quiet"
                danger
                act={cancelDrawAction}
              >
                {WORDS.callOffText}
              </DrawButton>
            </div>
          )}
        </Section>
      )}
      {draw.results && (
        <Section title={WORDS.given} note={[draw.fairText, draw.resultText].filter(Boolean).join(' ')}>
          {draw.results.map((slot) => (
            <Section
              key={slot.slot}
              level={3}
              title={WORDS.givenIn(slot.name)}
              note={slot.lines.length === 0 ? WORDS.nobodyWanted : undefined}
            >
              <DrawResults
                club={slug}
                draw={{ id: draw.id, published: draw.state === 'published' }}
                results={slot}
                offer={offerSwapAction}
                accept={acceptSwapAction}
                giveBack={giveBackAction}
              />
            </Section>
          ))}
        </Section>
      )}
      <Section title={WORDS.how} note={draw.pointText}>
        <p className="max-w-2xl">{WORDS.howText}</p>
        {draw.slots.length > 1 && <p className="mt-2 max-w-2xl">{WORDS.howMany}</p>}
        <p className="mt-2 text-ink-soft">
          {WORDS.seed} <span className="break-all">{draw.seed}</span>
        </p>
        <p className="mt-2">{draw.entered.length === 0 ? WORDS.nobody : WORDS.entered(draw.entered)}</p>
      </Section>
    </>
  );
});
