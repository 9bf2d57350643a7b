import type { ReactNode } from 'react';

interface RuledLinesProps {
  /** Lines drawn; more appear where the writing needs them. */
  lines: number;
  /** What was written; blank lines without it. */
  children?: ReactNode;
}

/** Height of one ruled line, as `.ruled` draws it. */
export const LINE_PX = 38;

/** Ruled answer lines, blank or with what the student wrote. */
export function RuledLines({ lines, children }: RuledLinesProps) {
  return (
    <div className="ruled whitespace-pre-wrap [overflow-wrap:anywhere]" style={{ minHeight: lines * LINE_PX }}>
      {children}
    </div>
  );
}
