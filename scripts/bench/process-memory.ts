import { existsSync, readdirSync, readFileSync } from 'node:fs';

const readStatus = (processId: number | string) => readFileSync(`/proc/${processId}/status`, 'utf8');

const residentMb = (processId: number) =>
  Number(/^VmRSS:\s+(\d+) kB$/m.exec(readStatus(processId))?.[1]) / 1024;

/** Resident memory of a process, looked at ten times a second until told to stop; null where there is no /proc. */
export function watchMemory(
  processId: number | null,
): { startMb: number; peakMb(): number; stop(): void } | null {
  if (processId === null) return null;
  const startMb = residentMb(processId);
  let peakMb = startMb;
  const looking = setInterval(() => (peakMb = Math.max(peakMb, residentMb(processId))), 100);
  return { startMb, peakMb: () => peakMb, stop: () => clearInterval(looking) };
}

const isChildOf = (parentId: number) => (processId: string) => {
  try {
    return readStatus(processId).includes(`\nPPid:\t${parentId}\n`);
  } catch {
    // It ended while we looked.
    return false;
  }
};

/** The process that `npm start` runs the server in: the only child of npm's own; null where there is no /proc. */
export function findServingProcess(npmProcessId: number): number | null {
  if (!existsSync('/proc/self/status')) return null;
  const processIds = readdirSync('/proc').filter((name) => /^\d+$/.test(name));
  return Number(processIds.find(isChildOf(npmProcessId)) ?? npmProcessId);
}
