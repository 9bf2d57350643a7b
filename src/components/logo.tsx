import { useId } from 'react';

const STRANDS = [
  {
    path: 'M13.5 7C13.5 15.25 32 15.25 32 23.5C32 32 50.5 32 50.5 40.5C50.5 48.75 50.5 48.75 50.5 57',
    ink: 'var(--ink)',
    over: 'M50.5 23.5C50.5 32 32 32 32 40.5',
  },
  {
    path: 'M32 7C32 15.25 13.5 15.25 13.5 23.5C13.5 32 13.5 32 13.5 40.5C13.5 48.75 32 48.75 32 57',
    ink: 'var(--accent)',
    over: 'M13.5 7C13.5 15.25 32 15.25 32 23.5',
  },
  {
    path: 'M50.5 7C50.5 15.25 50.5 15.25 50.5 23.5C50.5 32 32 32 32 40.5C32 48.75 13.5 48.75 13.5 57',
    ink: 'var(--ink)',
    over: 'M13.5 40.5C13.5 48.75 32 48.75 32 57',
  },
];

/** The mark and the name. */
export function Logo({ isLarge = false }: { isLarge?: boolean }) {
  const id = useId();
  return (
    <>
      <svg width="30" height="30" viewBox="0 0 64 64" aria-hidden="true">
        <defs>
          {STRANDS.map(({ over }) => (
            <mask
              key={over}
              id={`${id}-${over.length}-${over.slice(1, 3)}`}
              maskUnits="userSpaceOnUse"
              x="0"
              y="0"
              width="64"
              height="64"
            >
              <path fill="#fff" d="M0 0h64v64H0z" />
              <path d={over} fill="none" stroke="#000" strokeWidth="15.5" />
            </mask>
          ))}
        </defs>
        <g fill="none" strokeWidth="10.5" strokeLinecap="round">
          {STRANDS.map(({ path, ink, over }) => (
            <path key={path} d={path} style={{ stroke: ink }} mask={`url(#${id}-${over.length}-${over.slice(1, 3)})`} />
          ))}
        </g>
      </svg>
      <span className={`disp leading-none !font-bold ${isLarge ? 'text-[1.625rem]' : 'text-[1.375rem]'}`}>Plait</span>
    </>
  );
}
