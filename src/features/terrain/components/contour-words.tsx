import { Notice } from '@/ui/notices';
import type { ContoursView } from '../read-contours';

/** What the lines on the map say, in words. */
export function ContourWords({ view, error }: { view: ContoursView | undefined; error: string | null }) {
  if (error) return <Notice level="caution" live title={error} />;
  if (!view) return <p className="text-ink-soft text-sm">Reading the ground…</p>;
  const { interval, lowest, highest, unit, source } = view;
  return (
    <p className="text-ink-soft text-sm" aria-live="polite">
      A contour every {interval} {unit}; the ground lies between {lowest} and {highest} {unit}. Heights by {source}.
    </p>
  );
}
