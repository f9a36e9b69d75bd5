import { problemCodes, type Problem as ProblemBody, type ProblemCode } from '../../shared/contract/problem';

type Extras = { issues?: ProblemBody['issues']; current?: unknown };

/** The one error that is told to a person. Everything else becomes a bare 500 with a request id. */
export class Problem extends Error {
  readonly status: number;
  readonly title: string;
  readonly issues: ProblemBody['issues'];
  readonly current: unknown;

  constructor(
    readonly code: ProblemCode,
    readonly detail: string = problemCodes[code].title,
    extras: Extras = {},
  ) {
    super(detail);
    this.status = problemCodes[code].status;
    this.title = problemCodes[code].title;
    this.issues = extras.issues ?? [];
    this.current = extras.current;
  }
}
