import { problemSchema, type Problem } from '../../shared/contract/problem';

/** An error answer of the server, with every issue of the input by JSON pointer (RFC 9457, RFC 6901). */
export class ApiProblem extends Error {
  readonly problem: Problem;

  constructor(problem: Problem) {
    super(problem.detail || problem.title);
    this.name = 'ApiProblem';
    this.problem = problem;
  }
  get code(): string {
    return this.problem.code;
  }
  get status(): number {
    return this.problem.status;
  }
  get title(): string {
    return this.problem.title;
  }
  get detail(): string {
    return this.problem.detail;
  }
  get issues(): Problem['issues'] {
    return this.problem.issues;
  }
}

function buildProblem(code: string, status: number, title: string, detail: string): ApiProblem {
  return new ApiProblem({ type: 'about:blank', title, status, code, detail, requestId: null, issues: [] });
}

/** The request never got an answer. */
export const buildUnreachableProblem = (): ApiProblem =>
  buildProblem(
    'unreachable',
    0,
    'The server does not answer',
    'Nothing was sent twice and nothing was changed here. Check the connection, then try again.',
  );

/** The answer is not what the contract says: page and server are of different versions. */
export const buildUnexpectedAnswerProblem = (status: number): ApiProblem =>
  buildProblem(
    'unexpected-answer',
    status,
    'The answer could not be understood',
    'This page may be older than the server. Reload it; if that does not help, tell the administrator.',
  );

/** Reads a problem+json body; anything else becomes an unexpected answer with its status. */
export function readProblem(status: number, body: unknown): ApiProblem {
  const parsed = problemSchema.safeParse(body);
  return parsed.success ? new ApiProblem(parsed.data) : buildUnexpectedAnswerProblem(status);
}
