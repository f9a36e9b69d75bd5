import { byteMutations, type Mutation } from './byte-mutations';
import { elementMutations } from './element-mutations';
import { valueMutations } from './value-mutations';

/**
 * Every way of spoiling a file, by its name, in three families that are chosen from equally often: what spoils bytes
 * or structure mostly ends early, what spoils values reaches the depth of the reader.
 */
export const mutationFamilies: readonly Record<string, Mutation>[] = [
  byteMutations,
  elementMutations,
  valueMutations,
];
