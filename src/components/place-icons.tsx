import type { ReactNode } from 'react';

/** Drawn here, and not taken from the icon package, because every page carries them. */
function Icon({ children }: { children: ReactNode }) {
  return (
    <svg
      aria-hidden="true"
      width="21"
      height="21"
      viewBox="0 0 24 24"
      fill="none"
      stroke="currentColor"
      strokeWidth="1.75"
      strokeLinecap="round"
      strokeLinejoin="round"
      className="md:hidden"
    >
      {children}
    </svg>
  );
}

/** A sun: today. */
export const SunIcon = () => (
  <Icon>
    <circle cx="12" cy="12" r="4" />
    <path d="M12 2v2M12 20v2M4.93 4.93l1.41 1.41M17.66 17.66l1.41 1.41M2 12h2M20 12h2M6.34 17.66l-1.41 1.41M19.07 4.93l-1.41 1.41" />
  </Icon>
);

/** A strand between two ends: the mixed set. */
export const StrandIcon = () => (
  <Icon>
    <circle cx="19" cy="5" r="2" />
    <circle cx="5" cy="19" r="2" />
    <path d="M5 17A12 12 0 0 1 17 5" />
  </Icon>
);

/** A list with ticks: topics. */
export const ListIcon = () => (
  <Icon>
    <path d="M13 5h8M13 12h8M13 19h8M3 17l2 2 4-4M3 7l2 2 4-4" />
  </Icon>
);
