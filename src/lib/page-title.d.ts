/** Names the browser's tab and history entry after the page. */
export declare function usePageTitle(title: string): void;
