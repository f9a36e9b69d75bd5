import type { Bench } from './bench';

const targetS = 5;

export const bench: Bench = {
  name: 'Warm start to the first page',
  target: `under ${targetS} s`,
  run: async ({ startTimes: { warmS } }) => ({ measured: `${warmS.toFixed(1)} s`, isMet: warmS < targetS }),
};
