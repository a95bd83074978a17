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

interface FeedActions {
  club: string;
  make: (club: string, values: { scope: FeedScope; withPlace: boolean }) => Promise<ActionResult<MadeFeed>>;
  revoke: (club: string, values: { scope: FeedScope }) => Promise<ActionResult<{ revoked: number }>>;
}

interface FeedText {
  title: string;
  note: string;
}

const LOST = 'The server could not be reached. Try again.';

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
    if (!answer?.ok) return answer?.error.message ?? LOST;
    setUrl(answer.data.url);
    toast({ title: answer.data.replaced ? 'New address made; the old one is off' : 'Address made' });
    return undefined;
  }

  async function turnOff(): Promise<string | undefined> {
    const answer = await revoke(club, { scope: feed.scope }).catch(() => null);
    if (!answer?.ok) return answer?.error.message ?? LOST;
    setUrl(undefined);
    toast({ title: 'Address turned off' });
    return undefined;
  }

  return (
    <Section title={text.title} note={text.note} heading="margin">
      <div className="flex flex-col gap-4">
        <p>
          {feed.madeOn === null
            ? 'No address is in use.'
            : `An address made on ${feed.madeOn} is in use, ${feed.withPlace ? 'with' : 'without'} stand positions.`}
        </p>
        {problem && (
          <Notice level="caution" live title="That did not work">
            {problem}
          </Notice>
        )}
        {url && (
          <CopyField
            label="Address for your calendar"
            hint="Shown only now. In your calendar, add a calendar by its address and paste this."
            value={url}
            secret
          />
        )}
        <Checkbox
          label="Put stand positions in the entries"
          hint="Stand places are secrets: whoever sees your calendar sees them too."
          checked={withPlace}
          onChange={(event) => setWithPlace(event.currentTarget.checked)}
        />
        <div className="flex flex-wrap gap-2">
          {feed.madeOn === null ? (
            <Button look="primary" pending={pending} onClick={async () => setProblem(await makeAddress())}>
              Make an address
            </Button>
          ) : (
            <>
              <ConfirmDialog
                title="Make a new address?"
                confirmLabel="Make a new address"
                trigger={<Button>Make a new address</Button>}
                onConfirm={makeAddress}
              >
                The address in use stops working at once. Calendars that hold it need the new one.
              </ConfirmDialog>
              <ConfirmDialog
                title="Turn the address off?"
                confirmLabel="Turn it off"
                danger
                trigger={<Button look="quiet">Turn it off</Button>}
                onConfirm={turnOff}
              >
                Calendars that hold it are told nothing more of any sit.
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
