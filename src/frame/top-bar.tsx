import { Link } from 'react-router-dom';
import type { User } from '../../shared/contract/session';
import { paths } from '../paths';
import { Mark } from './mark';
import { PersonMenu } from './person-menu';
import { PlaceMenu, PlaceRow } from './place-menu';
import { findPlaces } from './places';

/** The slim bar: mark, places, person; its lower border is drawn like the border of a chart. */
export function TopBar({ user }: { user: User }) {
  const places = findPlaces(user);
  return (
    <header className="print:hidden">
      <div className="mx-auto flex h-12 max-w-[96rem] items-center gap-x-5 px-4 md:px-8">
        <Link to={paths.home} className="flex items-center gap-2.5" aria-label="Leeward, to your own place">
          <Mark className="h-6" />
          <span className="wide text-lg font-semibold max-md:sr-only">Leeward</span>
        </Link>
        <nav aria-label="Places" className="h-full max-md:flex max-md:items-center md:ml-3">
          <PlaceRow places={places} />
          <PlaceMenu places={places} />
        </nav>
        <PersonMenu user={user} />
      </div>
      <div className="neatline" />
    </header>
  );
}
