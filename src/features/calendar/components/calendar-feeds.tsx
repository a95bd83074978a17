'use client';

import { useState } from 'react';
import type { ActionResult } from '@/server/doors';
import { Button } from '@/ui/button';
import { Checkbox } from '@/ui/choices';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import { CopyField } from '@/ui/copy-field';
import { Notice } from '@/ui/notices';
import { Section } from '@/ui/page-parts';
import { useToast } from '@/ui/toast';
import type { FeedScope } from '../feed-schema';
import type { MadeFeed } from '../make-feed';
import type { FeedView } from '../reads';
import { CALENDAR_FEED_WORDS } from '../words';

interface FeedActions {
  club: string;
  make: (club: string, values: { scope: FeedScope; withPlace: boolean }) => Promise<ActionResult<MadeFeed>>;
  revoke: (club: string, values: { scope: FeedScope }) => Promise<ActionResult<{ revoked: number }>>;
}

interface FeedText {
  title: string;
  note: string;
}

function Feed({ club, make, revoke, feed, text }: FeedActions & { feed: FeedView; text: FeedText }) {
  const toast = useToast();
  const [withPlace, setWithPlace] = useState(feed.withPlace);
  const [url, setUrl] = useState<string>();
  const [problem, setProblem] = useState<string>();
  const [pending, setPending] = useState(false);

  async function makeAddress(): Promise<string | undefined> {
    setPending(true);
    const answer = await make(club, { scope: feed.scope, withPlace }).catch(() => null);
    setPending(false);
    if (!answer?.ok) return answer?.error.message ?? CALENDAR_FEED_WORDS.lost;
    setUrl(answer.data.url);
    toast({ title: answer.data.replaced ? CALENDAR_FEED_WORDS.renewed : CALENDAR_FEED_WORDS.made });
    return undefined;
  }

  async function turnOff(): Promise<string | undefined> {
    const answer = await revoke(club, { scope: feed.scope }).catch(() => null);
    if (!answer?.ok) return answer?.error.message ?? CALENDAR_FEED_WORDS.lost;
    setUrl(undefined);
    toast({ title: CALENDAR_FEED_WORDS.turnedOff });
    return undefined;
  }

  return (
    <Section title={text.title} note={text.note} heading="margin">
      <div className="flex flex-col gap-4">
        <p>
          {feed.madeOn === null ? CALENDAR_FEED_WORDS.none : CALENDAR_FEED_WORDS.inUse(feed.madeOn, feed.withPlace)}
        </p>
        {problem && (
          <Notice level="caution" live title={CALENDAR_FEED_WORDS.failed}>
            {problem}
          </Notice>
        )}
        {url && (
          <CopyField label={CALENDAR_FEED_WORDS.address} hint={CALENDAR_FEED_WORDS.addressHint} value={url} secret />
        )}
        <Checkbox
          label={CALENDAR_FEED_WORDS.withPlace}
          hint={CALENDAR_FEED_WORDS.withPlaceHint}
          checked={withPlace}
          onChange={(event) => setWithPlace(event.currentTarget.checked)}
        />
        <div className="flex flex-wrap gap-2">
          {feed.madeOn === null ? (
            <Button look="primary" pending={pending} onClick={async () => setProblem(await makeAddress())}>
              {CALENDAR_FEED_WORDS.make}
            </Button>
          ) : (
            <>
              <ConfirmDialog
                title={CALENDAR_FEED_WORDS.renewTitle}
                confirmLabel={CALENDAR_FEED_WORDS.renew}
                trigger={<Button>{CALENDAR_FEED_WORDS.renew}</Button>}
                onConfirm={makeAddress}
              >
                {CALENDAR_FEED_WORDS.renewText}
              </ConfirmDialog>
              <ConfirmDialog
                title={CALENDAR_FEED_WORDS.turnOffTitle}
                confirmLabel={CALENDAR_FEED_WORDS.turnOff}
                danger
                trigger={<Button look="quiet">{CALENDAR_FEED_WORDS.turnOff}</Button>}
                onConfirm={turnOff}
              >
                {CALENDAR_FEED_WORDS.turnOffText}
              </ConfirmDialog>
            </>
          )}
        </div>
      </div>
    </Section>
  );
}

export function CalendarFeeds({
  feeds,
  texts,
  ...actions
}: FeedActions & { feeds: FeedView[]; texts: Record<FeedScope, FeedText> }) {
  return (
    <>
      {feeds.map((feed) => (
        <Feed key={feed.scope} {...actions} feed={feed} text={texts[feed.scope]} />
      ))}
    </>
  );
}
