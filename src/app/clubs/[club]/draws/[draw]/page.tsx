import { DrawButton } from '@/features/draws/components/draw-button';
import { DrawResults } from '@/features/draws/components/draw-results';
import { EntryForm } from '@/features/draws/components/entry-form';
import { readDraw } from '@/features/draws/reads';
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
} from '../actions';

export const metadata = { title: 'Draw' };

export default clubPage('draws.enter', async ({ scope, params }) => {
  const { slug, name } = scope.club;
  const draw = await readDraw(scope, params.draw ?? '', now());
  const may = scope.can('draws.write');
  const values = { drawId: draw.id };
  return (
    <>
      <PageTitle over={`${name}: draw`} title={draw.title} lead={draw.stateText} />
      {draw.note !== '' && <p className="mb-4 max-w-2xl">{draw.note}</p>}
      {draw.state === 'cancelled' && <Notice>This draw was called off. Nobody's points changed.</Notice>}
      {draw.mayEnter && (
        <Section title="Your wishes" note={`You have ${draw.points} ${draw.points === 1 ? 'point' : 'points'}.`}>
          <EntryForm
            club={slug}
            form={draw.form}
            hasEntered={draw.hasEntered}
            stands={draw.stands}
            enter={enterDrawAction}
          />
          {draw.hasEntered && (
            <div className="mt-4">
              <DrawButton
                club={slug}
                values={values}
                label="Leave the draw"
                title="Leave the draw"
                done="You are out of the draw"
                look="quiet"
                act={leaveDrawAction}
              >
                Your wishes are removed. You may enter again until it closes.
              </DrawButton>
            </div>
          )}
        </Section>
      )}
      {draw.results && (
        <Section title="What each was given" note={[draw.fairText, draw.resultText].filter(Boolean).join(' ')}>
          <DrawResults
            club={slug}
            draw={draw}
            offer={offerSwapAction}
            accept={acceptSwapAction}
            giveBack={giveBackAction}
          />
        </Section>
      )}
      {may && (draw.state === 'open' || draw.state === 'drawn') && (
        <Section title="For the admin">
          <div className="flex flex-wrap gap-3">
            {draw.state === 'drawn' && (
              <DrawButton
                club={slug}
                values={values}
                label="Publish"
                title="Publish the draw"
                done="Published and booked"
                look="primary"
                act={publishDrawAction}
              >
                Every stand given is booked and its member is told by mail. If one of them cannot be booked, none is.
              </DrawButton>
            )}
            {draw.mayMake && (
              <DrawButton
                club={slug}
                values={values}
                label={draw.state === 'open' ? 'Make the draw' : 'Make it again'}
                title="Make the draw"
                done="The draw is made"
                look={draw.state === 'open' ? 'primary' : 'plain'}
                act={runDrawAction}
              >
                The sums take up to 20 seconds. Nothing is booked and nobody but you sees it until you publish it. The
                same wishes and the same seed give the same result.
              </DrawButton>
            )}
            <DrawButton
              club={slug}
              values={values}
              label="Call it off"
              title="Call the draw off"
              done="Called off"
              look="quiet"
              danger
              act={cancelDrawAction}
            >
              Nothing is booked and nobody's points change.
            </DrawButton>
          </div>
        </Section>
      )}
      <Section title="How it is drawn" note={draw.pointText}>
        <p className="max-w-2xl">
          Any stand at all counts for more than a better choice, and each later choice for a quarter less than the one
          before it; the first in line counts about double the last. The sums find the sharing out of the greatest total
          under every booking rule of the club. Guests are added to the sit afterwards.
        </p>
        <p className="mt-2 text-ink-soft">
          Seed: <span className="break-all">{draw.seed}</span>
        </p>
        <p className="mt-2">
          {draw.entered.length === 0 ? 'Nobody has entered yet.' : `Entered: ${draw.entered.join(', ')}.`}
        </p>
      </Section>
    </>
  );
});
