'use client';

import { useRouter } from 'next/navigation';
import { useRef, useState } from 'react';
import { sendFile } from '@/lib/send-file';
import { Button } from '@/ui/button';
import { Checkbox } from '@/ui/choices';
import { Field } from '@/ui/field';
import { Notice } from '@/ui/notices';
import { ProgressBar } from '@/ui/progress-bar';
import { useToast } from '@/ui/toast';
import type { Subject } from '../data';
import { MOST_PHOTO_BYTES } from '../photo-schema';
import { ADD_PHOTOS_WORDS } from '../words';

const words = ADD_PHOTOS_WORDS;

interface Sending {
  at: number;
  of: number;
  name: string;
  share: number;
}

/** Sends photos one after another; one that is refused does not hold up the rest. */
export function AddPhotos({ club, subject }: { club: string; subject: Subject }) {
  const router = useRouter();
  const toast = useToast();
  const form = useRef<HTMLFormElement>(null);
  const [keepTime, setKeepTime] = useState(true);
  const [sending, setSending] = useState<Sending | null>(null);
  const [problems, setProblems] = useState<string[]>([]);

  async function send(chosen: File[]) {
    const refused: string[] = [];
    let added = 0;
    for (const [i, file] of chosen.entries()) {
      const step = { at: i + 1, of: chosen.length, name: file.name };
      setSending({ ...step, share: 0 });
      const query = new URLSearchParams({ subject: subject.subject, id: subject.id, time: keepTime ? 'keep' : 'drop' });
      const answer =
        file.size > MOST_PHOTO_BYTES
          ? { ok: false as const, message: words.tooBig(MOST_PHOTO_BYTES / 1024 / 1024) }
          : await sendFile<{ id: string }>(`/api/clubs/${club}/photos?${query}`, file, (share) =>
              setSending({ ...step, share }),
            );
      if (answer.ok) added += 1;
      else refused.push(words.refused(file.name, answer.message));
    }
    setSending(null);
    setProblems(refused);
    if (added > 0) {
      form.current?.reset();
      toast({ title: words.added(added) });
      router.refresh();
    }
  }

  return (
    <form
      ref={form}
      method="post"
      className="grid max-w-2xl gap-3"
      onSubmit={(event) => {
        event.preventDefault();
        const chosen = new FormData(event.currentTarget)
          .getAll('photos')
          .filter((one): one is File => one instanceof File && one.size > 0);
        if (chosen.length > 0) void send(chosen);
        else setProblems([words.chooseFirst]);
      }}
    >
      <Field label={words.add} hint={words.addHint}>
        {(control) => (
          <input
            {...control}
            name="photos"
            type="file"
            accept="image/*"
            multiple
            disabled={sending !== null}
            className="min-h-11 w-full border border-rule-strong bg-paper p-2 file:mr-3 file:border-0 file:bg-sunk file:px-3 file:py-1 file:text-ink"
          />
        )}
      </Field>
      <Checkbox
        label={words.keepTime}
        checked={keepTime}
        disabled={sending !== null}
        onChange={({ target }) => setKeepTime(target.checked)}
      />
      {sending && (
        <ProgressBar
          label={words.progress(sending.at, sending.of, sending.name)}
          share={sending.share < 1 ? sending.share : null}
        />
      )}
      {problems.map((problem) => (
        <Notice key={problem} live level="caution" title={problem} />
      ))}
      <div>
        <Button type="submit" pending={sending !== null} pendingLabel={words.sending}>
          {words.send}
        </Button>
      </div>
    </form>
  );
}
