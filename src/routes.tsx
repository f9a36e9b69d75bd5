import { createBrowserRouter, redirect, type LoaderFunctionArgs, type RouteObject } from 'react-router-dom';
import { sessionQueries } from './features/session/queries';
import { uploads } from './features/uploads/uploads';
import { Frame } from './frame/frame';
import { NotFound } from './frame/not-found';
import { RouteError } from './frame/route-error';
import { Waiting } from './frame/waiting';
import { queryClient } from './lib/query-client';
import { buildSignInPath, paths } from './paths';

/** The URL map of what stands behind the sign-in. A page is loaded when it is opened. */
const pages: RouteObject[] = [
  { path: paths.home, lazy: () => import('./pages/home') },
  { path: paths.procedures, lazy: () => import('./pages/procedures') },
  { path: paths.doseReports, lazy: () => import('./pages/dose-reports') },
  { path: paths.staffExposure, lazy: () => import('./pages/staff-exposure') },
  { path: paths.myExposure, lazy: () => import('./pages/my-exposure') },
  { path: paths.methods, lazy: () => import('./pages/methods') },
  { path: paths.procedure(':id'), lazy: () => import('./pages/procedure') },
  { path: paths.procedureRecord(':id'), lazy: () => import('./pages/procedure-record') },
  { path: paths.enterByHand, lazy: () => import('./pages/enter-by-hand') },
  { path: paths.enterFigures(':id'), lazy: () => import('./pages/enter-by-hand') },
  { path: paths.correctEntry(':id', ':entryId'), lazy: () => import('./pages/correct-entry') },
  { path: paths.garments, lazy: () => import('./pages/garments') },
  { path: paths.garment(':id'), lazy: () => import('./pages/garment') },
  { path: paths.administration, lazy: () => import('./pages/admin') },
  { path: paths.people, lazy: () => import('./pages/admin-people') },
  { path: paths.person(':id'), lazy: () => import('./pages/admin-person') },
  { path: paths.rooms, lazy: () => import('./pages/admin-rooms') },
  { path: paths.room(':id'), lazy: () => import('./pages/admin-room') },
  { path: paths.equipment, lazy: () => import('./pages/admin-equipment') },
  { path: paths.machine(':id'), lazy: () => import('./pages/admin-machine') },
  { path: paths.dataChecks, lazy: () => import('./pages/admin-data-checks') },
  { path: paths.dataCheck(':code'), lazy: () => import('./pages/admin-data-check') },
  { path: paths.procedureTypes, lazy: () => import('./pages/admin-procedure-types') },
  { path: paths.procedureType(':id'), lazy: () => import('./pages/admin-procedure-type') },
  { path: '*', Component: NotFound },
];

async function requirePerson({ request }: LoaderFunctionArgs): Promise<null> {
  const { user } = await queryClient.ensureQueryData({
    ...sessionQueries.current(),
    revalidateIfStale: true,
  });
  if (user) return null;
  const { pathname, search } = new URL(request.url);
  throw redirect(buildSignInPath(pathname + search));
}

/** At the sign-in page nothing of the person before may remain. */
async function fetchSession(): Promise<null> {
  queryClient.clear();
  uploads.forget();
  await queryClient.ensureQueryData(sessionQueries.current());
  return null;
}

export const createRouter = () =>
  createBrowserRouter([
    {
      errorElement: <RouteError />,
      hydrateFallbackElement: <Waiting />,
      children: [
        { path: paths.signIn, loader: fetchSession, lazy: () => import('./pages/sign-in') },
        {
          path: paths.signInLink(':token'),
          loader: fetchSession,
          lazy: () => import('./pages/welcome'),
        },
        {
          loader: requirePerson,
          // The session may have ended since: every change of page asks the cache again.
          shouldRevalidate: () => true,
          Component: Frame,
          children: [{ errorElement: <RouteError />, children: pages }],
        },
      ],
    },
  ]);
