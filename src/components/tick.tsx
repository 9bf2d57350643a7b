interface SignProps {
  size?: number;
  /** Draws itself once, as a pen does. */
  isDrawn?: boolean;
  /** Read aloud; decorative without it. */
  label?: string;
}

/** The marker's tick: earned, or done. */
export function Tick({ size = 18, isDrawn = false, label }: SignProps) {
  return (
    <>
      <svg
        aria-hidden="true"
        className={`ticked flex-none ${isDrawn ? 'tick-drawn' : ''}`}
        width={size}
        height={size}
        viewBox="0 0 24 24"
        strokeWidth="2.9"
      >
        <path pathLength={isDrawn ? 1 : undefined} d="M3 13.2c1.9.9 3.6 3 4.7 6.1C10 12.6 14.3 7 21.2 3.6" />
      </svg>
      {label ? <span className="sr-only">{label}</span> : null}
    </>
  );
}

/** The marker's caret: missed. */
export function Caret({ size = 17, label }: SignProps) {
  return (
    <>
      <svg
        aria-hidden="true"
        className="ticked flex-none"
        style={{ stroke: 'var(--gap)' }}
        width={size}
        height={size}
        viewBox="0 0 24 24"
        strokeWidth="2.8"
      >
        <path d="M4 19 12 7l8 12" />
      </svg>
      {label ? <span className="sr-only">{label}</span> : null}
    </>
  );
}
