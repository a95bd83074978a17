import { formatDay } from '@/core/day-time';
import { ButtonLink } from '@/ui/button';
import { EmptyState, Notice } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';
import type { SitsAskText } from '../ask-schema';
import type { BookActions, Hunter } from '../book-actions';
import { briefView } from '../brief-view';
import { detailAddress, listAddress } from '../read-addresses';
import type { KeptSitsView } from '../view-types';
import { SIT_LIST_WORDS as WORDS, windowTitle } from '../words/list';
import { OLD_LIST_WORDS } from '../words/rows';
import { BackToWindow } from './back-to-window';
import { BlockedList } from './blocked-list';
import { ForecastNote } from './forecast-note';
import { LookAgain } from './look-again';
import { OpenRows } from './open-rows';
import { SitHead } from './sit-head';
import { SitRow } from './sit-row';

export interface SitScreenProps {
  ask: SitsAskText;
  view: KeptSitsView;
  /** Row open at first. */
  openStandId: string | null;
  actions: BookActions;
  /** Members an admin may book for; null: only oneself. */
  hunters: Hunter[] | null;
  may: { book: boolean; addStands: boolean };
  /** The address names no window: the next one is shown. */
  isNext: boolean;
}

/** The ranked list, drawn by the server; only what is pressed has a script. */
export function SitScreen({ ask, view, openStandId, actions, hunters, may, isNext }: SitScreenProps) {
  const { club, window, madeAt, mark } = view;
  const title = windowTitle(formatDay(window.day), window.window);
  return (
    <>
      <PageTitle
        over={<span className="max-sm:hidden">{club.name}</span>}
        title={title}
        actions={
          <ButtonLink look="quiet" className="max-sm:hidden" href={`/clubs/${club.slug}/week`}>
            {WORDS.wholeWeek}
          </ButtonLink>
        }
      />
      <SitHead view={view} />
      <div className="mt-3 grid gap-3">
        <BackToWindow club={club.slug} window={{ ...window, title }} isNext={isNext} madeAt={madeAt} />
        <ForecastNote forecast={view.forecast} now={madeAt} />
        <LookAgain
          address={listAddress(club.slug, ask)}
          mark={mark}
          madeAt={madeAt}
          old={
            <Notice level="caution" live title={OLD_LIST_WORDS.listTitle}>
              {OLD_LIST_WORDS.text}
            </Notice>
          }
        />
        <ListNotices view={view} />
      </div>
      {view.standCount === 0 ? (
        <NoStands club={club.slug} addStands={may.addStands} />
      ) : (
        <OpenRows view={briefView(view)} ask={ask} openStandId={openStandId} actions={actions} hunters={hunters}>
          <RankedList view={view} ask={ask} mayBook={may.book && !view.over} />
        </OpenRows>
      )}
      <BlockedList rows={view.blocked} />
    </>
  );
}

/** What is to be known of all rows before one is chosen. */
function ListNotices({ view }: { view: KeptSitsView }) {
  const { mine, cautions, over, club } = view;
  return (
    <>
      {cautions.map((caution) => (
        <Notice key={caution.text} level={caution.level === 'stop' ? 'stop' : 'caution'} title={caution.text} />
      ))}
      {over && <Notice title={WORDS.overTitle}>{WORDS.over}</Notice>}
      {mine && (
        <Notice
          title={WORDS.youSit(mine.standName, mine.windows)}
          actions={<ButtonLink href={`/clubs/${club.slug}/my-sits`}>{WORDS.change}</ButtonLink>}
        >
          {!over && WORDS.orMove}
        </Notice>
      )}
    </>
  );
}

function NoStands({ club, addStands }: { club: string; addStands: boolean }) {
  return (
    <div className="mt-6">
      <EmptyState
        title={WORDS.noStandsTitle}
        action={
          addStands && (
            <ButtonLink look="primary" href={`/clubs/${club}/stands/new`}>
              {WORDS.addFirst}
            </ButtonLink>
          )
        }
      >
        {addStands ? WORDS.addThem : WORDS.stewardAdds}
      </EmptyState>
    </div>
  );
}

function RankedList({ view, ask, mayBook }: { view: KeptSitsView; ask: SitsAskText; mayBook: boolean }) {
  return (
    <section aria-labelledby="ranked" className="mt-4 sm:mt-6">
      <h2 id="ranked" className="sr-only">
        {WORDS.heading}
      </h2>
      {view.open.length === 0 ? (
        <EmptyState title={WORDS.noneOpenTitle}>{WORDS.noneOpen}</EmptyState>
      ) : (
        <ol className="border-rule-strong border-t">
          {view.open.map((row) => (
            <SitRow
              key={row.standId}
              row={row}
              startAt={view.window.startAt}
              detail={detailAddress(view.club.slug, row.standId, ask)}
              mayBook={mayBook}
            />
          ))}
        </ol>
      )}
    </section>
  );
}
