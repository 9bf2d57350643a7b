import { Search } from 'lucide-react';
import { type FormEvent, useEffect, useId, useRef, useState } from 'react';

interface SearchBoxProps {
  label: string;
  /** The search in force. */
  value: string;
  onSearch: (text: string) => void;
}

const PAUSE_MS = 250;

/** Searches as you type, after a short pause, and at once on Enter. */
export function SearchBox({ label, value, onSearch }: SearchBoxProps) {
  const id = useId();
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  // Null while the box follows the address; the typed text until the address has caught up.
  const [typed, setTyped] = useState<string | null>(null);
  if (typed === value) setTyped(null);
  useEffect(() => () => clearTimeout(timer.current), []);
  // A filter may change the address between the typing and the search; the search must not take it back.
  const latest = useRef(onSearch);
  useEffect(() => {
    latest.current = onSearch;
  });
  const submit = (event: FormEvent) => {
    event.preventDefault();
    clearTimeout(timer.current);
    if (typed !== null) onSearch(typed);
  };
  return (
    <search className="min-w-[15rem] flex-1 md:max-w-[20rem]">
      <form onSubmit={submit} className="field">
        <label htmlFor={id} className="text-sm">
          {label}
        </label>
        <div className="relative">
          <span className="absolute top-1/2 left-2.5 -translate-y-1/2 text-ink-2">
            <Search size={17} strokeWidth={1.75} aria-hidden />
          </span>
          <input
            id={id}
            type="search"
            className="inp sm !min-h-9 !pl-9 max-md:!min-h-11"
            maxLength={200}
            autoComplete="off"
            value={typed ?? value}
            onChange={(event) => {
              const text = event.target.value;
              setTyped(text);
              clearTimeout(timer.current);
              timer.current = setTimeout(() => latest.current(text), PAUSE_MS);
            }}
          />
        </div>
      </form>
    </search>
  );
}
