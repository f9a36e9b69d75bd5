import type { ErrorRequestHandler, RequestHandler } from 'express';
import { MulterError } from 'multer';
import type { Problem as ProblemBody } from '../../shared/contract/problem';
import { isDatabaseAway } from '../db/is-database-away';
import { Problem } from '../kernel/problem';

/** What libraries throw, in our own words. */
function toProblem(error: unknown): Problem | null {
  if (error instanceof Problem) return error;
  if (error instanceof MulterError)
    return error.code === 'LIMIT_FILE_SIZE'
      ? new Problem(
          'too-large',
          'A file is larger than the limit; nothing of this request was kept. Send it alone or ask for a higher limit.',
        )
      : new Problem(
          'malformed-request',
          'The upload could not be read: send the files in the field "files".',
        );
  const { type, status } = error as { type?: string; status?: number };
  if (type === 'entity.too.large') return new Problem('too-large');
  if (type?.startsWith('entity.') || type === 'charset.unsupported') return new Problem('malformed-request');
  if (status === 404) return new Problem('not-found');
  if (isDatabaseAway(error)) return new Problem('unavailable');
  return null;
}

export const handleProblem: ErrorRequestHandler = (error, request, response, next) => {
  if (response.headersSent) return next(error);
  const problem = toProblem(error);
  if (!problem) request.log.error({ err: error }, 'unexpected error');
  const shown =
    problem ?? new Problem('unexpected', 'It was recorded under this request id; nothing was changed.');
  const body: ProblemBody = {
    type: `urn:leeward:problem:${shown.code}`,
    title: shown.title,
    status: shown.status,
    code: shown.code,
    detail: shown.detail,
    requestId: String(request.id),
    issues: shown.issues,
    ...(shown.current === undefined ? {} : { current: shown.current }),
  };
  response.status(shown.status).type('application/problem+json').send(JSON.stringify(body));
};

export const handleUnknownRoute: RequestHandler = () => {
  throw new Problem('not-found', 'No such address.');
};
