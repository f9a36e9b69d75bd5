import { Foundation1764547200000 } from './1764547200000-foundation';

/** In the order they run. */
export const migrations = [Foundation1764547200000];
