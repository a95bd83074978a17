import type { Arc } from '@/core/ground-types';
import { WindStrip } from '@/ui/wind/wind-strip';

/** The strip's bars alone, beside words that say the same. */
export function ArcBars({ arcs, className }: { arcs: Arc[]; className?: string }) {
  return (
    <span aria-hidden="true" className="block">
      <WindStrip arcs={arcs} rows={[]} className={className} />
    </span>
  );
}
