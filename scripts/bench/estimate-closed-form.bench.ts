import type { Bench } from './bench';
import { estimateLongCase } from './estimated-case';
import { timeMedianMs } from './measure';

const targetMs = 3;
const count = 100;

export const bench: Bench = {
  name: 'Staff estimate, 300 events × 6 people, closed form',
  target: `median under ${targetMs} ms`,
  run: async () => {
    const medianMs = await timeMedianMs(count, () => estimateLongCase({}), { warmUps: 50 });
    return { measured: `${medianMs.toFixed(2)} ms (median of ${count})`, isMet: medianMs < targetMs };
  },
};
