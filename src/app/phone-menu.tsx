import { Link } from 'react-router-dom';
import { useDisclosure } from '#src/lib/use-disclosure.ts';
import { isCurrent, type Place } from './navigation.ts';

/** The places of a person of staff, on a phone. */
export function PhoneMenu({ places, pathname }: { places: Place[]; pathname: string }) {
  const { isOpen, frame, button, toggle, close } = useDisclosure();
  return (
    <div ref={frame} className="relative md:hidden">
      <button
        ref={button}
        type="button"
        className="btn quiet"
        aria-expanded={isOpen}
        aria-controls="menu"
        onClick={toggle}
      >
        Menu
      </button>
      <ul
        id="menu"
        hidden={!isOpen}
        className="absolute left-0 max-sm:-left-16 top-full z-30 mt-2 w-56 rounded-lg border border-rule bg-raise p-2 shadow-lift"
      >
        {places.map((place) => (
          <li key={place.to}>
            <Link
              to={place.to}
              onClick={close}
              aria-current={isCurrent(place, pathname) ? 'page' : undefined}
              className="flex min-h-11 items-center border-l-[3px] border-transparent px-3 aria-[current]:border-accent aria-[current]:font-semibold"
            >
              {place.label}
            </Link>
          </li>
        ))}
      </ul>
    </div>
  );
}
