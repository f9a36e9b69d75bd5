import { isRouteErrorResponse, useRouteError } from 'react-router-dom';
import { ApiProblem } from '../lib/api-problem';
import { paths } from '../paths';
import { Button } from '../ui/button';
import { ProblemNote } from '../ui/problem-note';
import { TextLink } from '../ui/text-link';
import { NotFound } from './not-found';
import { Page } from './page';

/** Stands in a page's place when its data or its code failed. */
export function RouteError() {
  const error = useRouteError();
  if (isNotFound(error)) return <NotFound />;
  return (
    <Page title="This page could not be shown">
      <ProblemNote
        error={error}
        kept="What you saved before is kept."
        next={
          <div className="flex flex-wrap items-center gap-4 pt-1">
            <Button onClick={() => window.location.reload()}>Load the page again</Button>
            <TextLink to={paths.home}>Go to your own place</TextLink>
          </div>
        }
      />
    </Page>
  );
}

const isNotFound = (error: unknown): boolean =>
  (error instanceof ApiProblem && error.status === 404) ||
  (isRouteErrorResponse(error) && error.status === 404);
