import { Navigate } from 'react-router-dom';
import { useUser } from '../features/session/queries';
import { findAdminPlaces } from '../frame/admin-places';
import { NotFound } from '../frame/not-found';

/** Leads to the first register that the person may edit. */
export function Component() {
  const first = findAdminPlaces(useUser())[0];
  return first ? <Navigate to={first.path} replace /> : <NotFound />;
}
