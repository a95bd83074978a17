import type { ReactNode } from 'react';

interface SignProps {
  /** Size by a class such as `size-5`; 24 px without one. */
  className?: string | undefined;
}

function Sign({ className, children }: SignProps & { children: ReactNode }) {
  return (
    <svg
      viewBox="0 0 24 24"
      width={24}
      height={24}
      fill="none"
      stroke="currentColor"
      strokeWidth={2}
      strokeLinecap="round"
      strokeLinejoin="round"
      aria-hidden="true"
      className={className}
    >
      {children}
    </svg>
  );
}

/** A sign of one path. Each is a decoration: the words beside it say the same. */
export const drawn = (d: string) => (props: SignProps) => (
  <Sign {...props}>
    <path d={d} />
  </Sign>
);

export const NoteSign = drawn('M3 12a9 9 0 1 0 18 0a9 9 0 1 0-18 0M12 11v6M12 7.5v.01');
export const CautionSign = drawn('M12 3.5 2.5 20.5h19zM12 10v4.5M12 17.5v.01');
export const StopSign = drawn('M8 3h8l5 5v8l-5 5H8l-5-5V8zM9 9l6 6M15 9l-6 6');
export const DownSign = drawn('M6 9.5l6 6l6-6');
export const PagesSign = drawn('M4 6h16M4 12h16M4 18h16');
export const CloseSign = drawn('M6 6l12 12M18 6L6 18');
export const TickSign = drawn('M4.5 12.5l5 5l10-11');
export const LessSign = drawn('M5 12h14');
export const MoreSign = drawn('M5 12h14M12 5v14');
export const RisingSign = drawn('M12 20V4M6 10l6-6l6 6');
export const FallingSign = drawn('M12 4v16M6 14l6 6l6-6');
export const SortableSign = drawn('M8 9l4-4l4 4M8 15l4 4l4-4');
export const KeysSign = drawn('M3 6h18v12H3zM7 10v.01M11 10v.01M15 10v.01M17 14v.01M7 14h7');
/** Half a sun, half a moon. */
export const LightSign = drawn('M12 4a8 8 0 1 0 0 16zM12 4a8 8 0 0 1 0 16M12 1v.01M12 23v.01M1 12h.01M23 12h.01');
export const NoSignalSign = drawn('M4 20h.01M9 20v-4M14 20v-8M19 20V4M3 3l18 18');
