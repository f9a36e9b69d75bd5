export type QueryValues = Record<string, string | number | boolean | null | undefined>;
/** Appends the given values to a path as its query; missing and empty ones are left out. */
export declare function withQuery(path: string, values: QueryValues): string;
