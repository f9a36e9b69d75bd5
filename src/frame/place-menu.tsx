import { useRef } from 'react';
import { NavLink, useLocation } from 'react-router-dom';
import { Chevron } from '../ui/chevron';
import { joinClassNames } from '../lib/class-names';
import { dropBelow } from './drop-below';

type PlaceLink = { path: string; name: string };

/** The places in a row; the open one fills its part of the bar's border. */
export const PlaceRow = ({ places }: { places: readonly PlaceLink[] }) => (
  <ul className="hidden h-full items-stretch gap-x-5 lg:gap-x-6 md:flex">
    {places.map((place) => (
      <li key={place.path} className="flex">
        <NavLink
          to={place.path}
          className={({ isActive }) =>
            joinClassNames(
              'relative flex items-center whitespace-nowrap after:absolute after:inset-x-0 after:-bottom-[5px] after:h-[5px]',
              isActive ? 'font-semibold after:bg-lee' : 'text-ink-2 hover:text-ink hover:after:bg-ramp-3',
            )
          }
        >
          {place.name}
        </NavLink>
      </li>
    ))}
  </ul>
);

/** On a phone: the open place's name, and the others behind it. */
export function PlaceMenu({ places }: { places: readonly PlaceLink[] }) {
  const { pathname } = useLocation();
  const menu = useRef<HTMLUListElement>(null);
  const open = places.find((place) => pathname.startsWith(place.path));
  return (
    <div className="md:hidden">
      <button type="button" popoverTarget="places" className="flex min-h-11 items-center gap-2 font-semibold">
        {open?.name ?? 'Places'}
        <Chevron />
      </button>
      <ul
        ref={menu}
        id="places"
        popover="auto"
        onBeforeToggle={dropBelow}
        className="fixed inset-x-0 bottom-auto m-0 w-full border-y border-edge bg-surface p-2 text-ink shadow-lg"
      >
        {places.map((place) => (
          <li key={place.path}>
            <NavLink
              to={place.path}
              onClick={() => menu.current?.hidePopover()}
              className={({ isActive }) =>
                joinClassNames(
                  'flex min-h-11 items-center border-l-4 px-3',
                  isActive ? 'border-lee font-semibold' : 'border-transparent',
                )
              }
            >
              {place.name}
            </NavLink>
          </li>
        ))}
      </ul>
    </div>
  );
}
