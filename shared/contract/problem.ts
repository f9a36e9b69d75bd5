import { z } from 'zod';

/** An error answer in the form of RFC 9457, with every issue of the input at once. */
export const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  code: z.string(),
  detail: z.string(),
  requestId: z.string().nullable(),
  issues: z.array(z.object({ pointer: z.string(), detail: z.string() })),
  current: z.unknown().optional(),
});
export type Problem = z.infer<typeof problemSchema>;

/** Every error the server tells on purpose: code → status and title. */
export const problemCodes = {
  'invalid-input': { status: 422, title: 'Some of the input cannot be taken' },
  'malformed-request': { status: 400, title: 'The request cannot be read' },
  'not-signed-in': { status: 401, title: 'Sign in first' },
  'wrong-credentials': { status: 401, title: 'E-mail or password is not right' },
  'not-permitted': { status: 403, title: 'Your role does not open this' },
  'cross-site': { status: 403, title: 'The request came from another site' },
  'not-found': { status: 404, title: 'There is nothing here' },
  conflict: { status: 409, title: 'Somebody changed this in the meantime' },
  'already-exists': { status: 409, title: 'This exists already' },
  'cannot-regroup': { status: 422, title: 'Reports cannot be grouped like that' },
  'link-spent': { status: 410, title: 'This link has been used or has expired' },
  'too-large': { status: 413, title: 'The file is larger than the limit' },
  'too-many-requests': { status: 429, title: 'Too many tries' },
  unexpected: { status: 500, title: 'Something went wrong on the server' },
  unavailable: { status: 503, title: 'The database does not answer' },
} as const satisfies Record<string, { status: number; title: string }>;
export type ProblemCode = keyof typeof problemCodes;
