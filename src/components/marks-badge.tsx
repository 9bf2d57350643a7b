interface MarksBadgeProps {
  /** Null while a part is still to be marked. */
  marks: number | null;
  maxMarks: number;
  isLarge?: boolean;
}

/** The examiner's box: earned over available. */
export function MarksBadge({ marks, maxMarks, isLarge = false }: MarksBadgeProps) {
  const words = marks === null ? `Not marked yet, out of ${maxMarks}` : `${marks} of ${maxMarks} marks`;
  return (
    <span className={`mbox num ${isLarge ? '!text-[2.25rem]' : ''}`}>
      <span className="sr-only">{words}</span>
      <b aria-hidden="true">{marks ?? '–'}</b>
      <i aria-hidden="true">/</i>
      <span aria-hidden="true">{maxMarks}</span>
    </span>
  );
}
