import { useId } from 'react';

interface SegmentedProps<Value extends string> {
  /** Names the choice for screen readers. */
  label: string;
  options: readonly { value: Value; label: string; isDisabled?: boolean }[];
  value: Value;
  /** Id of the words that explain the choice, or why one of the options cannot be chosen. */
  describedBy?: string;
  onChange: (value: Value) => void;
}

/** One choice of a few, all in sight. A radio group: arrow keys move and choose. */
export function Segmented<Value extends string>({
  label,
  options,
  value,
  describedBy,
  onChange,
}: SegmentedProps<Value>) {
  const name = useId();
  return (
    <fieldset className="seg min-w-0 max-w-full overflow-x-auto" aria-describedby={describedBy}>
      <legend className="sr-only">{label}</legend>
      {options.map((option) => (
        <label
          key={option.value}
          className="cursor-pointer max-md:min-h-11 has-checked:bg-ink has-checked:text-sheet has-disabled:cursor-not-allowed has-disabled:not-has-checked:text-ink-3 has-focus-visible:outline-3 has-focus-visible:-outline-offset-4 has-focus-visible:outline-focus"
        >
          <input
            type="radio"
            className="sr-only"
            name={name}
            value={option.value}
            checked={option.value === value}
            disabled={option.isDisabled}
            onChange={() => onChange(option.value)}
          />
          {option.label}
        </label>
      ))}
    </fieldset>
  );
}
