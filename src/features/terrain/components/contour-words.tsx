import { Notice } from '@/ui/notices';
import type { ContoursView } from '../read-contours';
import { CONTOUR_WORDS } from '../words';

/** What the lines on the map say, in words. */
export function ContourWords({ view, error }: { view: ContoursView | undefined; error: string | null }) {
  if (error) return <Notice level="caution" live title={error} />;
  if (!view) return <p className="text-ink-soft text-sm">{CONTOUR_WORDS.reading}</p>;
  return (
    <p className="text-ink-soft text-sm" aria-live="polite">
      {CONTOUR_WORDS.said(view)}
    </p>
  );
}
