import { useEffect, useRef, type ReactNode } from 'react';
import { ApiProblem } from '../lib/api-problem';

type ProblemNoteProps = {
  error: unknown;
  /** What was kept: "Your entries are still in the form." */
  kept?: ReactNode;
  /** What to do; a retry button, a link. */
  next?: ReactNode;
  /** JSON pointer → the field's name on this page. */
  fieldNames?: Record<string, string>;
};

/** An error: what happened, what was kept, what to do, and every issue of the input at once. */
export function ProblemNote({ error, kept, next, fieldNames = {} }: ProblemNoteProps) {
  const note = useRef<HTMLDivElement>(null);
  useEffect(() => {
    // In braces: newer browsers return a promise from scrolling, which React would take for a cleanup.
    note.current?.scrollIntoView({ block: 'nearest' });
  }, [error]);
  if (error === null || error === undefined) return null;

  const problem = error instanceof ApiProblem ? error : null;
  const title = problem?.title ?? 'Something went wrong on this page';
  return (
    <div
      ref={note}
      role="alert"
      className="flex flex-col gap-1.5 border-l-3 border-beacon bg-surface px-4 py-3"
    >
      <p className="font-semibold text-beacon">{title}</p>
      {problem && problem.detail !== problem.title && <p>{problem.detail}</p>}
      {problem && problem.issues.length > 0 && (
        <ul className="list-disc pl-5">
          {problem.issues.map((issue) => (
            <li key={`${issue.pointer} ${issue.detail}`}>
              <strong className="font-semibold">
                {fieldNames[issue.pointer] ?? namePointer(issue.pointer)}
              </strong>
              : {issue.detail}
            </li>
          ))}
        </ul>
      )}
      {kept && <p className="text-ink-2">{kept}</p>}
      {next && <div>{next}</div>}
      {problem?.problem.requestId && (
        <p className="text-xs text-ink-2">Request {problem.problem.requestId}</p>
      )}
    </div>
  );
}

/** "/presences/2/garmentId" → "presences, 3, garment id": readable where a page gives no name. */
export function namePointer(pointer: string): string {
  const parts = pointer
    .split('/')
    .filter(Boolean)
    .map((part) =>
      /^\d+$/.test(part) ? String(Number(part) + 1) : part.replace(/([A-Z])/g, ' $1').toLowerCase(),
    );
  return parts.length === 0 ? 'The whole' : parts.join(', ');
}
