import type { Bench } from './bench';
import { sendInParallel } from './send-in-parallel';
import { signIn } from './sign-in';
import { writeNewReport, writeNewReports } from './written-report';

const targetPerS = 12;
const fileCount = 120;
const eventCount = 100;

export const bench: Bench = {
  name: `Reports of ${eventCount} events, one request each, 3 in flight`,
  target: `at least ${targetPerS} per second`,
  run: async (context) => {
    const cookie = await signIn(context, 'technologist');
    const files = await writeNewReports(fileCount, eventCount);
    const startedMs = performance.now();
    await sendInParallel(context.url, cookie, fileCount, () => files.pop() ?? writeNewReport(eventCount));
    const perS = fileCount / ((performance.now() - startedMs) / 1000);
    return { measured: `${perS.toFixed(1)} per second (${fileCount} files)`, isMet: perS >= targetPerS };
  },
};
