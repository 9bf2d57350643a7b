interface MarksBarProps {
  low: number;
  high: number;
  /** Marks of the whole paper: the end of the line. */
  max: number;
}

const WIDTH = 240;

/** A range of marks on a line from 0 to a paper's marks. The figures stand beside it, so the picture is silent. */
export function MarksBar({ low, high, max }: MarksBarProps) {
  const at = (marks: number) => 4 + ((WIDTH - 8) * marks) / max;
  return (
    <svg viewBox={`0 0 ${WIDTH} 18`} width={WIDTH} height="18" className="max-w-full" aria-hidden="true">
      <path d={`M4 9H${WIDTH - 4}M4 4V14M${WIDTH - 4} 4V14`} style={{ stroke: 'var(--rule)' }} strokeWidth="2" />
      <rect
        x={at(low)}
        y="5"
        width={Math.max(2, at(high) - at(low))}
        height="8"
        style={{ fill: 'color-mix(in oklab, var(--ink) 55%, var(--ground))' }}
      />
    </svg>
  );
}
