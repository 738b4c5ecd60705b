type Props = {
  /** What is under way, for everyone. */
  readonly label: string;
  /** 0 to 1, or null while it cannot be known. */
  readonly value: number | null;
};

/** How far something has come, with the words and the figure beside the bar. */
export function Progress({ label, value }: Props) {
  const percent = value === null ? null : Math.round(value * 100);
  return (
    <div className="grid gap-1">
      <div className="flex justify-between gap-4 text-sm text-slate">
        <span>{label}</span>
        {percent !== null && <span className="tabular-nums">{percent} %</span>}
      </div>
      <div
        role="progressbar"
        aria-label={label}
        aria-valuemin={0}
        aria-valuemax={100}
        aria-valuenow={percent ?? undefined}
        className="h-2 overflow-hidden rounded-round bg-seam"
      >
        <div
          className="h-full bg-cobalt transition-[width] duration-200 ease-world"
          style={{ width: `${percent ?? 30}%` }}
        />
      </div>
    </div>
  );
}
