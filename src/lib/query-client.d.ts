import { QueryClient, type QueryKey } from '@tanstack/react-query';
declare module '@tanstack/react-query' {
    interface Register {
        mutationMeta: {
            /** Keys (prefixes) of the queries that this mutation makes stale. */
            invalidates?: readonly QueryKey[];
        };
    }
}
/** The signed-in person's query; when any answer says "not signed in", it is asked again. */
export declare const sessionKey: readonly ["session"];
/** The page's cache. What a mutation makes stale is said in its meta and done here, in one place. */
export declare function createQueryClient(): QueryClient;
export declare const queryClient: QueryClient;
