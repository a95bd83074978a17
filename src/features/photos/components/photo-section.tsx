import type { ClubCall } from '@/features/ground/components/form-types';
import { Section } from '@/ui/page-parts';
import type { PhotosView } from '../read-photos';
import { PHOTOS_WORDS } from '../words';
import { AddPhotos } from './add-photos';
import { PhotoGrid } from './photo-grid';

interface PhotoSectionProps {
  club: string;
  /** null: nothing of it may be seen. */
  view: PhotosView | null;
  caption: ClubCall<{ id: string; caption: string }, { caption: string }>;
  remove: ClubCall<{ id: string }, { id: string }>;
}

/** Photos of a thing, and a way to add some for those who may. */
export function PhotoSection({ club, view, caption, remove }: PhotoSectionProps) {
  if (!view || (view.photos.length === 0 && !view.mayAdd)) return null;
  return (
    <Section title={PHOTOS_WORDS.title} note={view.mayAdd ? PHOTOS_WORDS.note : undefined}>
      <div className="grid gap-4">
        {view.photos.length === 0 ? (
          <p className="text-ink-soft">{PHOTOS_WORDS.none}</p>
        ) : (
          <PhotoGrid club={club} photos={view.photos} caption={caption} remove={remove} />
        )}
        {view.mayAdd && <AddPhotos club={club} subject={view.subject} />}
      </div>
    </Section>
  );
}
