'use client';

import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '@/ui/button';
import { CopyField } from '@/ui/copy-field';
import { Dialog } from '@/ui/dialog';
import { FieldError } from '@/ui/field';
import { boardKey } from '../queries';
import type { BoardSit } from '../reads';
import type { BoardActions } from './board-actions';

const LOST = 'The server could not be reached. Try again.';

interface Props {
  club: string;
  sit: BoardSit;
  outing: { id: string; linked: boolean };
  actions: Pick<BoardActions, 'share' | 'revoke'>;
}

function Links({ club, sit, outing, actions }: Props) {
  const queries = useQueryClient();
  const [url, setUrl] = useState<string>();
  const [said, setSaid] = useState('');
  const [error, setError] = useState<string>();
  const [pending, setPending] = useState(false);
  const values = { outingId: outing.id };

  async function run(work: () => Promise<string | undefined>) {
    setPending(true);
    setError(await work().catch(() => LOST));
    setPending(false);
    await queries.invalidateQueries({ queryKey: boardKey(club) });
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
      setSaid('The links no longer work.');
    });

  return (
    <div className="grid gap-4">
      <p>
        A page for this sit alone: stand, way in, parking, vehicle, back-by time and whether{' '}
        {sit.mine ? 'you are' : `${sit.memberName} is`} out. It needs no account and works until three days after the
        back-by time. Whoever has the link can open it.
      </p>
      {url && (
        <CopyField label="Link for somebody at home" value={url} hint="It is shown this once. Send it yourself." />
      )}
      <div className="flex flex-wrap gap-3">
        {sit.mine && (
          <Button look="primary" pending={pending} onClick={share}>
            {url ? 'Make another link' : 'Make a link'}
          </Button>
        )}
        {(outing.linked || url) && (
          <Button pending={pending} onClick={revoke}>
            Turn all links off
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
export function ShareDialog(props: Props) {
  const { sit } = props;
  return (
    <Dialog
      title="A link for somebody at home"
      trigger={
        <Button look="quiet" aria-label={`Link for home: ${sit.memberName}, ${sit.standName}`}>
          Link for home
        </Button>
      }
    >
      <Links {...props} />
    </Dialog>
  );
}
