import type { CSSProperties } from 'react';

const STRANDS = new Set(['en', 'el', 'ma', 'bi', 'ch', 'ph', 'ge', 'hi', 'fr', 'cs', 'rs']);

/** The colours of a strand as --s (fill), --e (edge) and --l (label); plain ink for one we do not know. */
export function strandColours(strand: string): { s: string; e: string; l: string } {
  return STRANDS.has(strand)
    ? { s: `var(--s-${strand})`, e: `var(--e-${strand})`, l: `var(--l-${strand})` }
    : { s: 'var(--ink-2)', e: 'var(--ink)', l: 'var(--sheet)' };
}

interface StrandLabelProps {
  subject: { code: string; name: string; strand: string };
  isPale?: boolean;
  isLarge?: boolean;
}

/** The two-letter label of a subject. Its name belongs beside it, or is read from it. */
export function StrandLabel({ subject, isPale = false, isLarge = false }: StrandLabelProps) {
  const { s, e, l } = strandColours(subject.strand);
  const style = { '--s': s, '--e': e, '--l': l } as CSSProperties;
  return (
    <span className={`strand ${isPale ? 'pale' : ''} ${isLarge ? 'lg' : ''}`} style={style} title={subject.name}>
      {subject.code}
    </span>
  );
}
