import { sectorName } from '@/core/sectors';
import { COMPASS_WORDS } from '../words/wind';

export interface CompassMarkProps {
  /** Degrees true the arrow points to; null: every way. */
  bearingDeg: number | null;
  /** Said in place of 'Faces NW, 315°'. */
  label?: string;
  size?: number;
  className?: string;
}

/** A small dial with north marked and an arrow: the way a seat faces or a person walks. */
export function CompassMark({ bearingDeg, label, size = 24, className }: CompassMarkProps) {
  const text =
    label ??
    (bearingDeg === null
      ? COMPASS_WORDS.everyWay
      : COMPASS_WORDS.faces(sectorName(bearingDeg), Math.round(bearingDeg) % 360));
  return (
    <svg viewBox="-14 -14 28 28" width={size} height={size} role="img" aria-label={text} className={className}>
      <title>{text}</title>
      <circle r={11} fill="none" stroke="currentColor" strokeWidth={1.25} />
      <path d="M0 -13.5V-8.5" stroke="currentColor" strokeWidth={2} />
      {bearingDeg === null ? (
        <circle r={2.5} fill="currentColor" />
      ) : (
        <path
          d="M0 -9L4 5L0 2.5L-4 5z"
          fill="currentColor"
          transform={`rotate(${Math.round(bearingDeg)})`}
          data-bearing={Math.round(bearingDeg)}
        />
      )}
    </svg>
  );
}
