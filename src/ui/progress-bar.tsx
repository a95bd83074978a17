interface ProgressBarProps {
  label: string;
  /** 0 to 1; null: how much is left is not known. */
  share: number | null;
}

/** Work under way, in words and as a bar. */
export function ProgressBar({ label, share }: ProgressBarProps) {
  const percent = share === null ? null : Math.round(share * 100);
  return (
    <div className="grid gap-1">
      <div className="flex justify-between text-sm">
        <span>{label}</span>
        <span>{percent === null ? '…' : `${percent} %`}</span>
      </div>
      <div
        role="progressbar"
        aria-label={label}
        aria-valuemin={0}
        aria-valuemax={100}
        aria-valuenow={percent ?? undefined}
        className="h-2 border border-rule-strong bg-sunk"
      >
        <div className="h-full bg-moss-fill" style={{ width: `${percent ?? 100}%` }} />
      </div>
    </div>
  );
}
