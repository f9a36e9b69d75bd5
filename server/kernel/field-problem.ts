import type { Problem as ProblemBody } from '../../shared/contract/problem';
import { Problem } from './problem';

/** Input that only the database can judge: told at its fields, like a schema's own issues. */
export const fieldProblem = (...issues: ProblemBody['issues']): Problem =>
  new Problem('invalid-input', 'Correct what is marked and send it again; nothing was changed.', { issues });
