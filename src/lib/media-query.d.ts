/** Follows a media query. */
export declare function useMediaQuery(query: string): boolean;
/** No movement for people who asked for none, and none while a browser is driven by a program. */
export declare function usePrefersStill(): boolean;
