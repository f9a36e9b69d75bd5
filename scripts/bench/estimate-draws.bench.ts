import type { Bench } from './bench';
import { estimateLongCase } from './estimated-case';
import { formatMs, timeMedianMs } from './measure';

const targetMs = 150;
const count = 15;
const draws = 2000;

export const bench: Bench = {
  name: `Staff estimate, 300 events × 6 people, ${draws} draws`,
  target: `median under ${targetMs} ms`,
  run: async () => {
    const medianMs = await timeMedianMs(count, () => estimateLongCase({ draws }), { warmUps: 3 });
    return { measured: `${formatMs(medianMs)} (median of ${count})`, isMet: medianMs < targetMs };
  },
};
