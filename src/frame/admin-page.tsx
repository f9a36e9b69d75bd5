import type { ComponentProps } from 'react';
import { NavLink } from 'react-router-dom';
import { useUser } from '../features/session/queries';
import { joinClassNames } from '../lib/class-names';
import { findAdminPlaces } from './admin-places';
import { Page } from './page';

/** A page of Administration: the registers in a row above its content. */
export function AdminPage({ children, ...page }: ComponentProps<typeof Page>) {
  const places = findAdminPlaces(useUser());
  return (
    <Page {...page}>
      <nav aria-label="Administration" className="-mt-3 border-b border-rule">
        <ul className="flex flex-wrap gap-x-6">
          {places.map(({ path, name }) => (
            <li key={path}>
              <NavLink
                to={path}
                className={({ isActive }) =>
                  joinClassNames(
                    'inline-block border-b-3 py-2',
                    isActive
                      ? 'border-lee font-semibold text-ink'
                      : 'border-transparent text-ink-2 hover:text-ink',
                  )
                }
              >
                {name}
              </NavLink>
            </li>
          ))}
        </ul>
      </nav>
      {children}
    </Page>
  );
}
