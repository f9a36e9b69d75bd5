import { procedureSorts } from '../../shared/contract/procedure-row';
import type { Bench } from './bench';
import { fetchBody } from './fetch-body';
import { formatMs, timeMedianMs } from './measure';
import { signIn } from './sign-in';

const targetMs = 50;
const count = 15;

export const bench: Bench = {
  name: "The ledger's first page by each column, both ways, at the server",
  target: `each median under ${targetMs} ms`,
  run: async (context) => {
    const cookie = await signIn(context, 'technologist');
    const times: { order: string; medianMs: number }[] = [];
    for (const sort of procedureSorts) {
      for (const order of ['descending', 'ascending']) {
        const address = `${context.url}/api/procedures?period=all&sort=${sort}&order=${order}`;
        times.push({
          order: `${sort} ${order}`,
          medianMs: await timeMedianMs(count, () => fetchBody(address, cookie)),
        });
      }
    }
    for (const { order, medianMs } of times) context.report(`  ${order}: ${formatMs(medianMs)}`);
    const slowest = times.reduce((one, other) => (other.medianMs > one.medianMs ? other : one));
    return {
      measured: `${formatMs(slowest.medianMs)} the slowest, ${slowest.order} (medians of ${count})`,
      isMet: slowest.medianMs < targetMs,
    };
  },
};
