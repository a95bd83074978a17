import { joinClasses } from './join-classes';
import { NAME } from './words/shell';

/** The product's name over a small unrolled compass with one bar of good wind. */
export function Wordmark({ className }: { className?: string }) {
  return (
    <span className={joinClasses('inline-block font-semibold font-serif leading-none tracking-tight', className)}>
      {NAME}
      <svg
        viewBox="0 0 100 7"
        preserveAspectRatio="none"
        className="mt-[0.14em] block h-[0.26em] w-full"
        aria-hidden="true"
      >
        <path
          d="M0.5 0V7M25 1.5V5.5M50 1.5V5.5M75 1.5V5.5M99.5 0V7M0 3.5H100"
          stroke="currentColor"
          vectorEffect="non-scaling-stroke"
          fill="none"
        />
        <path d="M0 1.5H6V5.5H0zM81 1.5H100V5.5H81z" fill="var(--color-moss)" />
      </svg>
    </span>
  );
}
