/** Joins class names, leaving out what does not apply. */
export declare const joinClassNames: (...names: (string | false | null | undefined)[]) => string;
