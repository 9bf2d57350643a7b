import type { Standing } from '#shared/schemas/standing.ts';

const COLOURS: Record<Standing, string> = {
  secure: 'var(--accent)',
  developing: 'var(--caution)',
  weak: 'var(--gap)',
  notEnough: 'var(--caution)',
  notStarted: 'var(--ink-3)',
};

interface RecallBarProps {
  /** 0–100; null where it is not known well enough. */
  value: number | null;
  standing: Standing;
  /** What it is probably within, 0–100; null where nothing was attempted. */
  range: { low: number; high: number } | null;
  width?: number;
}

/** A mark with its range on a 0–100 line, dashed at 80. The figures stand beside it, so the picture is silent. */
export function RecallBar({ value, standing, range, width = 240 }: RecallBarProps) {
  const at = (percent: number) => 4 + ((width - 8) * percent) / 100;
  const colour = COLOURS[standing];
  return (
    <svg viewBox={`0 0 ${width} 18`} width={width} height="18" className="max-w-full" aria-hidden="true">
      <path d={`M4 9H${width - 4}`} style={{ stroke: 'var(--rule)' }} strokeWidth="2" />
      {range ? (
        <rect
          x={at(range.low)}
          y="5"
          width={at(range.high) - at(range.low)}
          height="8"
          style={{ fill: `color-mix(in oklab, ${colour} 42%, var(--ground))` }}
        />
      ) : null}
      <path d={`M${at(80)} 2V16`} style={{ stroke: 'var(--ink-3)' }} strokeWidth="1.5" strokeDasharray="2 2.4" />
      {value === null ? null : (
        <path d={`M${at(value)} 1.5V16.5`} style={{ stroke: colour }} strokeWidth="3.5" strokeLinecap="round" />
      )}
    </svg>
  );
}
