import type { Bench } from './bench';
import { watchMemory } from './process-memory';
import { sendInParallel } from './send-in-parallel';
import { signIn } from './sign-in';
import { writeNewReport } from './written-report';

const targetMb = 350;
const fileCount = 2000;
/** Most reports are short; one in a hundred is so large that it is read in a thread of its own. */
const eventsOf = (index: number) => (index % 100 === 50 ? 300 : 15);

export const bench: Bench = {
  name: `Memory of the serving process while it receives ${fileCount} files`,
  target: `under ${targetMb} MB`,
  run: async (context) => {
    const cookie = await signIn(context, 'technologist');
    const memory = watchMemory(context.processId);
    if (memory === null) return { measured: 'not measured: this system has no /proc', isMet: null };
    const startedMs = performance.now();
    try {
      await sendInParallel(context.url, cookie, fileCount, (index) => writeNewReport(eventsOf(index)));
    } finally {
      memory.stop();
    }
    const tookS = (performance.now() - startedMs) / 1000;
    const peakMb = memory.peakMb();
    return {
      measured: `${peakMb.toFixed(0)} MB at most, ${memory.startMb.toFixed(0)} MB before (${tookS.toFixed(0)} s)`,
      isMet: peakMb < targetMb,
    };
  },
};
