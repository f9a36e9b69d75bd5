import type { Bench } from './bench';
import { sendReport } from './send-report';
import { signIn } from './sign-in';
import { writeNewReport } from './written-report';

const targetS = 20;
const fileCount = 200;
const eventCount = 40;
/** As the page sends them. */
const inFlight = 3;

export const bench: Bench = {
  name: `${fileCount} files of ${eventCount} events, one request each, ${inFlight} in flight`,
  target: `under ${targetS} s`,
  run: async (context) => {
    const cookie = await signIn(context, 'technologist');
    const files = Array.from({ length: fileCount }, () => writeNewReport(eventCount));
    const procedureIds = new Set<string>();
    const sendAll = async () => {
      for (let file = files.pop(); file; file = files.pop()) {
        const { procedureId } = await sendReport(context.url, cookie, file);
        if (procedureId) procedureIds.add(procedureId);
      }
    };
    const startedMs = performance.now();
    await Promise.all(Array.from({ length: inFlight }, sendAll));
    const tookS = (performance.now() - startedMs) / 1000;
    if (procedureIds.size !== fileCount) throw new Error(`${procedureIds.size} procedures came of it`);
    return { measured: `${tookS.toFixed(1)} s`, isMet: tookS < targetS };
  },
};
