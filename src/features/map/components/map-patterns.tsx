/** Fills of the paper map, told apart without colour. Dressed by the light that is on. */
export function MapPatterns() {
  const moss = 'var(--color-moss)';
  const soft = 'var(--color-ink-soft)';
  const clay = 'var(--color-clay)';
  return (
    <svg aria-hidden="true" focusable="false" className="absolute size-0">
      <defs>
        <pattern id="m-wood" width="14" height="14" patternUnits="userSpaceOnUse">
          <rect width="14" height="14" fill={moss} opacity="0.1" />
          <circle cx="3.5" cy="4" r="1.4" fill={moss} opacity="0.55" />
          <circle cx="10.5" cy="11" r="1.4" fill={moss} opacity="0.55" />
        </pattern>
        <pattern id="m-cut" width="14" height="14" patternUnits="userSpaceOnUse">
          <path d="M2 3h3M9 10h3" stroke={moss} strokeWidth="1.2" opacity="0.7" />
          <path d="M3.5 3v-2M10.5 10v-2" stroke={moss} strokeWidth="1" opacity="0.7" />
        </pattern>
        <pattern id="m-crop" width="8" height="8" patternUnits="userSpaceOnUse" patternTransform="rotate(20)">
          <path d="M0 4h8" stroke={soft} strokeWidth="0.8" opacity="0.5" />
        </pattern>
        <pattern id="m-swamp" width="16" height="12" patternUnits="userSpaceOnUse">
          <path d="M1 4h7M9 10h6M4 4v-2M6 4v-3M12 10v-2" stroke={soft} strokeWidth="0.9" opacity="0.7" />
        </pattern>
        <pattern id="m-water" width="16" height="8" patternUnits="userSpaceOnUse">
          <rect width="16" height="8" fill={soft} opacity="0.12" />
          <path d="M0 4q4 -3 8 0t8 0" fill="none" stroke={soft} strokeWidth="0.8" opacity="0.8" />
        </pattern>
        <pattern id="m-closed" width="9" height="9" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
          <path d="M0 0v9M0 0h9" stroke={clay} strokeWidth="1" opacity="0.6" />
        </pattern>
        <pattern id="m-noshoot" width="7" height="7" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
          <path d="M0 0v7" stroke={clay} strokeWidth="0.9" opacity="0.55" />
        </pattern>
        <pattern id="m-bedding" width="10" height="10" patternUnits="userSpaceOnUse">
          <rect width="10" height="10" fill={moss} opacity="0.14" />
          <path d="M2 5q2 2 4 0" fill="none" stroke={moss} strokeWidth="1" />
        </pattern>
        <pattern id="m-food" width="6" height="6" patternUnits="userSpaceOnUse" patternTransform="rotate(-45)">
          <rect width="6" height="6" fill={moss} opacity="0.1" />
          <path d="M0 3h6" stroke={moss} strokeWidth="1" opacity="0.7" />
        </pattern>
        <pattern id="m-mast" width="12" height="12" patternUnits="userSpaceOnUse">
          <circle cx="4" cy="4" r="2.2" fill="none" stroke={moss} strokeWidth="1" />
          <circle cx="10" cy="10" r="2.2" fill="none" stroke={moss} strokeWidth="1" />
        </pattern>
      </defs>
    </svg>
  );
}
