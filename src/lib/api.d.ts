import { z } from 'zod';
/** The schema of an answer without content. */
export declare const noContentSchema: z.ZodUndefined;
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
export declare function request<Schema extends z.ZodType>(path: string, { method, body, schema, signal }: RequestOptions<Schema>): Promise<z.output<Schema>>;
/**
 * Sends a form with files and tells how much has left (0..1). XMLHttpRequest, because fetch has no
 * progress of a request body.
 */
export declare function upload<Schema extends z.ZodType>(path: string, form: FormData, { schema, onProgress, signal, }: {
    schema: Schema;
    onProgress?: (share: number) => void;
    signal?: AbortSignal;
}): Promise<z.output<Schema>>;
export {};
