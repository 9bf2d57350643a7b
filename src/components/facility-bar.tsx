interface FacilityBarProps {
  /** Share of the marks gained, 0 to 1; null where too few answered. */
  facility: number | null;
  /** Said in place of a figure. */
  none: string;
}

const LENGTH = 44;

/** A small flat bar with its figure beside it. */
export function FacilityBar({ facility, none }: FacilityBarProps) {
  if (facility === null) return <span className="text-ink-3">{none}</span>;
  return (
    <span className="inline-flex items-center justify-end gap-2">
      <svg width={LENGTH} height="8" aria-hidden="true">
        <path d={`M0 4H${LENGTH}`} stroke="var(--rule)" strokeWidth="2" />
        <path d={`M0 4H${(LENGTH * facility).toFixed(1)}`} stroke="var(--ink-2)" strokeWidth="4" />
      </svg>
      <span className="w-8 text-right">{facility.toFixed(2)}</span>
    </span>
  );
}
