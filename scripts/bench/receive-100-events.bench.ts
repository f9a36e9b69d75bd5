import type { Bench } from './bench';
import { sendInParallel } from './send-in-parallel';
import { signIn } from './sign-in';
import { writeNewReport, writeNewReports } from './written-report';

const targetPerS = 12;
const fileCount = 120;
const eventCount = 100;
/** A server that has just started is slower: its code is compiled as it is used. */
const warmUps = 20;

export const bench: Bench = {
  name: `Reports of ${eventCount} events, one request each, 3 in flight`,
  target: `at least ${targetPerS} per second`,
  run: async (context) => {
    const cookie = await signIn(context, 'technologist');
    const files = await writeNewReports(fileCount + warmUps, eventCount);
    const takeFile = () => files.pop() ?? writeNewReport(eventCount);
    await sendInParallel(context.url, cookie, warmUps, takeFile);
    const startedMs = performance.now();
    await sendInParallel(context.url, cookie, fileCount, takeFile);
    const perS = fileCount / ((performance.now() - startedMs) / 1000);
    return { measured: `${perS.toFixed(1)} per second (${fileCount} files)`, isMet: perS >= targetPerS };
  },
};
