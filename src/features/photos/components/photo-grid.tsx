'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import type { ClubCall } from '@/features/ground/components/form-types';
import { Button } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import { Dialog } from '@/ui/dialog';
import { TextInput } from '@/ui/text-inputs';
import type { PhotoView } from '../read-photos';

interface PhotoGridProps {
  club: string;
  photos: PhotoView[];
  caption: ClubCall<{ id: string; caption: string }, { caption: string }>;
  remove: ClubCall<{ id: string }, { id: string }>;
}

const LOST = 'The server could not be reached. Try again.';

function said(photo: PhotoView, number: number): string {
  return photo.caption || `Photo ${number} by ${photo.byName}`;
}

function CaptionForm({ club, photo, caption }: { club: string; photo: PhotoView; caption: PhotoGridProps['caption'] }) {
  const router = useRouter();
  const [text, setText] = useState(photo.caption);
  const [problem, setProblem] = useState<string>();
  const [pending, setPending] = useState(false);
  return (
    <form
      method="post"
      className="flex flex-wrap items-end gap-2"
      onSubmit={async (event) => {
        event.preventDefault();
        setPending(true);
        const answer = await caption(club, { id: photo.id, caption: text }).catch(() => null);
        setPending(false);
        setProblem(answer?.ok ? undefined : (answer?.error.message ?? LOST));
        if (answer?.ok) router.refresh();
      }}
    >
      <TextInput
        label="What it shows"
        optional
        fieldClassName="grow"
        value={text}
        error={problem}
        onChange={({ target }) => setText(target.value)}
      />
      <Button type="submit" pending={pending} pendingLabel="Saving…">
        Save
      </Button>
    </form>
  );
}

export function PhotoGrid({ club, photos, caption, remove }: PhotoGridProps) {
  const router = useRouter();
  const address = (id: string, size: 'full' | 'thumb') => `/api/clubs/${club}/photos/${id}?size=${size}`;
  return (
    <ul className="grid grid-cols-2 gap-3 sm:grid-cols-3 lg:grid-cols-4">
      {photos.map((photo, i) => {
        const words = said(photo, i + 1);
        const facts = [photo.takenAt && `taken ${photo.takenAt}`, `by ${photo.byName}`].filter(Boolean).join(', ');
        return (
          <li key={photo.id} className="grid content-start gap-1">
            <Dialog
              title={words}
              description={facts}
              trigger={
                <button type="button" className="block w-full border border-rule bg-sunk" aria-label={`Open ${words}`}>
                  {/* biome-ignore lint/performance/noImgElement: pictures behind a door are not for a shared image cache */}
                  <img
                    src={address(photo.id, 'thumb')}
                    alt={words}
                    width={photo.width}
                    height={photo.height}
                    loading="lazy"
                    className="aspect-4/3 h-auto w-full object-cover"
                  />
                </button>
              }
            >
              <div className="grid gap-3">
                {/* biome-ignore lint/performance/noImgElement: pictures behind a door are not for a shared image cache */}
                <img
                  src={address(photo.id, 'full')}
                  alt={words}
                  width={photo.width}
                  height={photo.height}
                  className="max-h-[60dvh] w-full object-contain"
                />
                {photo.mayChange && <CaptionForm club={club} photo={photo} caption={caption} />}
                {photo.mayChange && (
                  <ConfirmDialog
                    title="Remove this photo?"
                    confirmLabel="Remove the photo"
                    danger
                    trigger={<Button>Remove</Button>}
                    onConfirm={async () => {
                      const answer = await remove(club, { id: photo.id }).catch(() => null);
                      if (!answer) return LOST;
                      if (!answer.ok) return answer.error.message;
                      router.refresh();
                    }}
                  >
                    <p>It is gone for everyone and cannot be brought back.</p>
                  </ConfirmDialog>
                )}
              </div>
            </Dialog>
            <span className="text-sm">{photo.caption}</span>
            <span className="text-ink-soft text-xs">{facts}</span>
          </li>
        );
      })}
    </ul>
  );
}
