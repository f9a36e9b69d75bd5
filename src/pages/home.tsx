import { Navigate } from 'react-router-dom';
import { findLanding } from '../features/session/find-landing';
import { useUser } from '../features/session/queries';
import { paths } from '../paths';

/** Leads everyone to the place that their role works in. */
export const Component = () => <Navigate to={paths[findLanding(useUser())]} replace />;
