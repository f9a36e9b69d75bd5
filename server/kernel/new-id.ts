import { v7 } from 'uuid';

/** UUID version 7: keys sort by the time they were made. */
export const newId = (): string => v7();
