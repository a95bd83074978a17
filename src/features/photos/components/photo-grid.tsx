'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import type { ClubCall } from '@/features/ground/components/form-types';
import { Button } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import { Dialog } from '@/ui/dialog';
import { TextInput } from '@/ui/text-inputs';
import type { PhotoView } from '../read-photos';
import { PHOTO_WORDS } from '../words';

interface PhotoGridProps {
  club: string;
  photos: PhotoView[];
  caption: ClubCall<{ id: string; caption: string }, { caption: string }>;
  remove: ClubCall<{ id: string }, { id: string }>;
}

const words = PHOTO_WORDS;

function said(photo: PhotoView, number: number): string {
  return photo.caption || words.unnamed(number, photo.byName);
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
        setProblem(answer?.ok ? undefined : (answer?.error.message ?? words.lost));
        if (answer?.ok) router.refresh();
      }}
    >
      <TextInput
        label={words.caption}
        optional
        fieldClassName="grow"
        value={text}
        error={problem}
        onChange={({ target }) => setText(target.value)}
      />
      <Button type="submit" pending={pending} pendingLabel={words.saving}>
        {words.save}
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
        const name = said(photo, i + 1);
        const facts = words.facts(photo.takenAt, photo.byName);
        return (
          <li key={photo.id} className="grid content-start gap-1">
            <Dialog
              title={name}
              description={facts}
              trigger={
                <button type="button" className="block w-full border border-rule bg-sunk" aria-label={words.open(name)}>
                  {/* biome-ignore lint/performance/noImgElement: pictures behind a door are not for a shared image cache */}
                  <img
                    src={address(photo.id, 'thumb')}
                    alt={name}
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
                  alt={name}
                  width={photo.width}
                  height={photo.height}
                  className="max-h-[60dvh] w-full object-contain"
                />
                {photo.mayChange && <CaptionForm club={club} photo={photo} caption={caption} />}
                {photo.mayChange && (
                  <ConfirmDialog
                    title={words.removeTitle}
                    confirmLabel={words.removeConfirm}
                    danger
                    trigger={<Button>{words.remove}</Button>}
                    onConfirm={async () => {
                      const answer = await remove(club, { id: photo.id }).catch(() => null);
                      if (!answer) return words.lost;
                      if (!answer.ok) return answer.error.message;
                      router.refresh();
                    }}
                  >
                    <p>{words.removeText}</p>
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
