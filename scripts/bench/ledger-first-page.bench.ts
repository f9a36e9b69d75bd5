import { procedureCountSchema, procedurePageSchema } from '../../shared/contract/procedure-row';
import type { Bench } from './bench';
import { fetchBody } from './fetch-body';
import { formatMs, timeMedianMs } from './measure';
import { signIn } from './sign-in';

const targetMs = 50;
const count = 30;

export const bench: Bench = {
  name: "The ledger's first page, at the server",
  target: `median under ${targetMs} ms`,
  run: async (context) => {
    const cookie = await signIn(context, 'technologist');
    const address = `${context.url}/api/procedures?period=all`;
    const { items } = procedurePageSchema.parse(JSON.parse(await fetchBody(address, cookie)));
    if (items.length !== 50) throw new Error(`${items.length} rows on the first page`);
    const { total } = procedureCountSchema.parse(
      JSON.parse(await fetchBody(`${context.url}/api/procedures/count?period=all`, cookie)),
    );
    const medianMs = await timeMedianMs(count, () => fetchBody(address, cookie), { warmUps: 5 });
    return {
      measured: `${formatMs(medianMs)} (median of ${count}, ${total} procedures)`,
      isMet: medianMs < targetMs,
    };
  },
};
