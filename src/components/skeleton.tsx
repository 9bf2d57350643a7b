const WIDTHS = ['60%', '48%', '72%', '55%', '66%', '42%'];

interface SkeletonProps {
  /** What is coming: "topics". */
  label: string;
  rows?: number;
}

/** Still sunk bars in the shape of a list. They show after 300 ms, so a quick answer never flickers. */
export function Skeleton({ label, rows = 4 }: SkeletonProps) {
  return (
    <div role="status" aria-busy="true" className="late grid gap-3 max-w-[34rem]">
      <span className="sr-only">Loading {label}</span>
      {Array.from({ length: rows }, (_, row) => row).map((row) => (
        <div key={row} aria-hidden="true" className="grid grid-cols-[28px_1fr_48px] gap-3 items-center">
          <span className="block rounded-sm h-[22px] bg-sunk" />
          <span className="block rounded-sm h-3 bg-sunk" style={{ width: WIDTHS[row % WIDTHS.length] }} />
          <span className="block rounded-sm h-3 bg-sunk" />
        </div>
      ))}
    </div>
  );
}

/** The same for a whole page: a heading and a list. */
export function PageSkeleton() {
  return (
    <div className="page">
      <div className="late mb-8 h-9 w-64 max-w-full rounded-sm bg-sunk" aria-hidden="true" />
      <Skeleton label="this page" rows={6} />
    </div>
  );
}
