'use client';

import { useState } from 'react';
import { Button } from '@/ui/button';
import { CopyField } from '@/ui/copy-field';
import { Dialog } from '@/ui/dialog';
import { FieldError } from '@/ui/field';
import type { Closes } from '@/ui/lazy-part';
import type { BoardSit } from '../reads';
import { SHARE_WORDS } from '../words/dialogs';
import type { BoardActions } from './board-actions';

export interface ShareDialogProps {
  club: string;
  sit: BoardSit;
  outing: { id: string; linked: boolean };
  actions: Pick<BoardActions, 'share' | 'revoke'>;
}

function Links({ club, sit, outing, actions }: ShareDialogProps) {
  const [url, setUrl] = useState<string>();
  const [said, setSaid] = useState('');
  const [error, setError] = useState<string>();
  const [pending, setPending] = useState(false);
  const values = { outingId: outing.id };

  async function run(work: () => Promise<string | undefined>) {
    setPending(true);
    setError(await work().catch(() => SHARE_WORDS.lost));
    setPending(false);
  }
  const share = () =>
    run(async () => {
      const answer = await actions.share(club, values);
      if (!answer.ok) return answer.error.message;
      setUrl(answer.data.url);
      setSaid('');
    });
  const revoke = () =>
    run(async () => {
      const answer = await actions.revoke(club, values);
      if (!answer.ok) return answer.error.message;
      setUrl(undefined);
      setSaid(SHARE_WORDS.off);
    });

  return (
    <div className="grid gap-4">
      <p>{SHARE_WORDS.about(sit.mine ? null : sit.memberName)}</p>
      {url && <CopyField label={SHARE_WORDS.link} value={url} hint={SHARE_WORDS.linkHint} />}
      <div className="flex flex-wrap gap-3">
        {sit.mine && (
          <Button look="primary" pending={pending} onClick={share}>
            {url ? SHARE_WORDS.makeAnother : SHARE_WORDS.make}
          </Button>
        )}
        {(outing.linked || url) && (
          <Button pending={pending} onClick={revoke}>
            {SHARE_WORDS.turnOff}
          </Button>
        )}
      </div>
      <p role="status">{said}</p>
      <div role="alert">
        <FieldError>{error}</FieldError>
      </div>
    </div>
  );
}

/** For the member, and for an officer where there are links to turn off. */
export function ShareDialog({ onClose, ...props }: ShareDialogProps & Closes) {
  return (
    <Dialog title={SHARE_WORDS.title} open onOpenChange={(open) => !open && onClose()}>
      <Links {...props} />
    </Dialog>
  );
}
