import { z } from 'zod';
import { buildUnexpectedAnswerProblem, buildUnreachableProblem, readProblem } from './api-problem';

/** The schema of an answer without content. */
export const noContentSchema = z.undefined();

type RequestOptions<Schema extends z.ZodType> = {
  method?: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  body?: unknown;
  schema: Schema;
  signal?: AbortSignal;
};

/**
 * The only fetch. Sends JSON, reads JSON, and lets nothing through that the contract does not know.
 *
 * @throws ApiProblem for every error answer, for no answer, and for one that the schema refuses.
 */
export async function request<Schema extends z.ZodType>(
  path: string,
  { method = 'GET', body, schema, signal }: RequestOptions<Schema>,
): Promise<z.output<Schema>> {
  const response = await fetch(path, {
    method,
    signal,
    credentials: 'same-origin',
    headers: {
      accept: 'application/json',
      ...(body !== undefined && { 'content-type': 'application/json' }),
    },
    body: body === undefined ? undefined : JSON.stringify(body),
  }).catch((error: unknown) => {
    throw isAbort(error) ? error : buildUnreachableProblem();
  });
  return readAnswer(response.status, await response.text(), schema);
}

/**
 * Sends a form with files and tells how much has left (0..1). XMLHttpRequest, because fetch has no
 * progress of a request body.
 */
export function upload<Schema extends z.ZodType>(
  path: string,
  form: FormData,
  {
    schema,
    onProgress,
    signal,
    headers = {},
  }: {
    schema: Schema;
    onProgress?: (share: number) => void;
    signal?: AbortSignal;
    headers?: Record<string, string>;
  },
): Promise<z.output<Schema>> {
  return new Promise((resolve, reject) => {
    const sender = new XMLHttpRequest();
    sender.open('POST', path);
    sender.setRequestHeader('accept', 'application/json');
    for (const [name, value] of Object.entries(headers)) sender.setRequestHeader(name, value);
    sender.upload.addEventListener('progress', (event) => {
      if (event.lengthComputable && event.total > 0) onProgress?.(event.loaded / event.total);
    });
    sender.addEventListener('load', () => {
      try {
        resolve(readAnswer(sender.status, sender.responseText, schema));
      } catch (error) {
        reject(error);
      }
    });
    sender.addEventListener('error', () => reject(buildUnreachableProblem()));
    sender.addEventListener('abort', () => reject(new DOMException('The upload was stopped.', 'AbortError')));
    signal?.addEventListener('abort', () => sender.abort(), { once: true });
    sender.send(form);
  });
}

function readAnswer<Schema extends z.ZodType>(
  status: number,
  text: string,
  schema: Schema,
): z.output<Schema> {
  const body = readJson(text);
  if (status < 200 || status > 299) throw readProblem(status, body);
  const parsed = schema.safeParse(body);
  if (!parsed.success) throw buildUnexpectedAnswerProblem(status);
  return parsed.data;
}

function readJson(text: string): unknown {
  if (text === '') return undefined;
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
}

const isAbort = (error: unknown): boolean => error instanceof DOMException && error.name === 'AbortError';
