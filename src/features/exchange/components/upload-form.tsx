'use client';

import { useRouter } from 'next/navigation';
import { useId, useState } from 'react';
import { sendFile } from '@/lib/send-file';
import { Button } from '@/ui/button';
import { Field } from '@/ui/field';
import { Notice } from '@/ui/notices';
import { ProgressBar } from '@/ui/progress-bar';
import { FILE_PROBLEMS } from '../words/files';
import { UPLOAD_WORDS } from '../words/import';

const words = UPLOAD_WORDS;

/** Sends a file of a map to be read, and opens what was found in it. */
export function UploadForm({ club, mostBytes }: { club: string; mostBytes: number }) {
  const megabytes = mostBytes / 1024 / 1024;
  const router = useRouter();
  const formId = useId();
  const [sent, setSent] = useState<number | null>(null);
  const [problem, setProblem] = useState<string | null>(null);

  async function send(file: File) {
    setProblem(null);
    if (file.size > mostBytes) {
      setProblem(FILE_PROBLEMS.bytes(megabytes));
      return;
    }
    setSent(0);
    const address = `/api/clubs/${club}/ground/import?name=${encodeURIComponent(file.name.slice(0, 200) || 'file')}`;
    const answer = await sendFile<{ id: string }>(address, file, setSent);
    if (answer.ok) {
      router.push(`/clubs/${club}/ground/import/${answer.data.id}`);
      return;
    }
    setSent(null);
    setProblem(answer.message);
  }

  return (
    <form
      id={formId}
      method="post"
      className="grid max-w-2xl gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        const file = new FormData(event.currentTarget).get('file');
        if (file instanceof File && file.size > 0) void send(file);
        else setProblem(words.choose);
      }}
    >
      <Field label={words.file} hint={words.hint(megabytes)}>
        {(control) => (
          <input
            {...control}
            name="file"
            type="file"
            accept=".gpx,.kml,.kmz,.geojson,.json,.csv,.txt"
            disabled={sent !== null}
            className="min-h-11 w-full border border-rule-strong bg-paper p-2 file:mr-3 file:border-0 file:bg-sunk file:px-3 file:py-1 file:text-ink"
          />
        )}
      </Field>
      {problem && (
        <Notice live level="caution" title={words.notRead}>
          {problem}
        </Notice>
      )}
      {sent !== null && <ProgressBar label={sent < 1 ? words.sending : words.reading} share={sent < 1 ? sent : null} />}
      <div>
        <Button
          type="submit"
          look="primary"
          pending={sent !== null}
          pendingLabel={sent !== null && sent < 1 ? words.sendingShort : words.readingShort}
        >
          {words.read}
        </Button>
      </div>
    </form>
  );
}
