import { readFileSync, readlinkSync } from 'node:fs';

/**
 * When a process began, in clock ticks since boot (/proc/PID/stat, field 22), or null if there is
 * no such process. Together with the process number it tells a process from a later one that was
 * given the same number.
 */
export function readProcessStart(pid: number): string | null {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    // The second field is the command in brackets and may hold spaces: count from behind it.
    return stat.slice(stat.lastIndexOf(')') + 2).split(' ')[19] ?? null;
  } catch {
    return null;
  }
}

/** Whether the process is a PostgreSQL server that works in this data directory. */
export function isServerOf(pid: number, dataDirectory: string): boolean {
  try {
    const command = readFileSync(`/proc/${pid}/comm`, 'utf8').trim();
    return ['postgres', 'postmaster'].includes(command) && readlinkSync(`/proc/${pid}/cwd`) === dataDirectory;
  } catch {
    return false;
  }
}
