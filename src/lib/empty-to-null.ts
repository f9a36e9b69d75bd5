/** For `setValueAs`: an empty field is a value not given. */
export const emptyToNull = (value: unknown): unknown => (value === '' ? null : value);
