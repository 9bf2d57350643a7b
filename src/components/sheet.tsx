import type { ReactNode } from 'react';

/** An exam page. Holds SheetRows. */
export function Sheet({ children }: { children: ReactNode }) {
  return <div className="sheet qsheet">{children}</div>;
}

interface SheetRowProps {
  children: ReactNode;
  /** In the number margin. */
  margin?: ReactNode;
  /** In the marks margin, which a phone does not have. */
  marks?: ReactNode;
  /** A hairline across the whole sheet, above this row. */
  hasRule?: boolean;
}

/** One row of an exam page: number margin, body, marks margin. */
export function SheetRow({ children, margin, marks, hasRule = false }: SheetRowProps) {
  const rule = hasRule ? 'border-t border-rule' : '';
  return (
    <>
      <div className={`mg ${rule}`}>{margin}</div>
      <div className={`px-4 md:px-8 min-w-0 ${rule}`}>{children}</div>
      <div className={`rm ${rule}`}>{marks}</div>
    </>
  );
}
