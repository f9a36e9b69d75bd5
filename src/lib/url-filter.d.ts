import type { z } from 'zod';
/**
 * Reads a filter from the query of the address. A part that the schema refuses falls back to its default
 * and spoils nothing else: old and hand-written links still open.
 */
export declare function readFilter<Schema extends z.ZodObject>(schema: Schema, query: URLSearchParams): z.output<Schema>;
/** Writes a changed filter into a query; defaults and empty parts are left out, foreign parts stay. */
export declare function writeFilter<Schema extends z.ZodObject>(schema: Schema, query: URLSearchParams, change: Partial<z.input<Schema>>): URLSearchParams;
/** The page's filter, kept in the address. Any change starts again at the first page of the list. */
export declare function useUrlFilter<Schema extends z.ZodObject>(schema: Schema): [z.output<Schema>, (change: Partial<z.input<Schema>>) => void];
