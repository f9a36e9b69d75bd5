import type { Bench } from './bench';
import { formatMs, timeMedianMs } from './measure';
import { sendReport } from './send-report';
import { signIn } from './sign-in';
import { writeNewReport, writeNewReports } from './written-report';

const targetMs = 400;
const count = 15;

export const bench: Bench = {
  name: '300-event report, request to committed',
  target: `median under ${targetMs} ms`,
  run: async (context) => {
    const cookie = await signIn(context, 'technologist');
    const warmUps = 3;
    const files = await writeNewReports(count + warmUps, 300);
    const sizeMb = (files[0]?.byteLength ?? 0) / 1e6;
    const medianMs = await timeMedianMs(
      count,
      () => sendReport(context.url, cookie, files.pop() ?? writeNewReport(300)),
      { warmUps },
    );
    return {
      measured: `${formatMs(medianMs)} (median of ${count}, ${sizeMb.toFixed(1)} MB each)`,
      isMet: medianMs < targetMs,
    };
  },
};
