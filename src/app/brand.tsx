import { Link } from 'react-router-dom';
import { Logo } from '#src/components/logo.tsx';

/** The name at the top left, leading home. */
export function Brand() {
  return (
    <Link to="/" className="flex items-center gap-2.5 min-h-11" aria-label="Plait, home">
      <Logo />
    </Link>
  );
}
