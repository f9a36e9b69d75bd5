import { findPercentile, timeAnswersDuring } from './answer-times';
import type { Bench } from './bench';
import { findMedian, formatMs } from './measure';
import { sendReport } from './send-report';
import { signIn } from './sign-in';
import { writeNewReports } from './written-report';

const targetS = 6;
const othersTargetMs = 100;
const count = 3;

export const bench: Bench = {
  name: '3,000-event report, request to committed, and the ledger meanwhile',
  target: `median under ${targetS} s, 95 % of ledger pages under ${othersTargetMs} ms`,
  run: async (context) => {
    const cookie = await signIn(context, 'technologist');
    const ledger = `${context.url}/api/procedures?period=all`;
    const files = await writeNewReports(count, 3000);
    const sizeMb = (files[0]?.byteLength ?? 0) / 1e6;
    const timesS: number[] = [];
    const othersMs: number[] = [];
    for (const file of files) {
      const send = async () => {
        const startedMs = performance.now();
        await sendReport(context.url, cookie, file);
        timesS.push((performance.now() - startedMs) / 1000);
      };
      othersMs.push(...(await timeAnswersDuring(send, ledger, cookie)));
    }
    const medianS = findMedian(timesS);
    const othersP95Ms = findPercentile(othersMs, 0.95);
    return {
      measured: `${medianS.toFixed(1)} s (median of ${count}, ${sizeMb.toFixed(0)} MB each), ${formatMs(othersP95Ms)} (of ${othersMs.length})`,
      isMet: medianS < targetS && othersP95Ms < othersTargetMs,
    };
  },
};
