import { startServer, type Server } from './control-server';
import { holdLock } from './hold-lock';
import { findRunningPort } from './postmaster-file';

const lookEveryMs = 1000;

/**
 * Starts the server again, on the port it had, whenever it ends by itself: killed for memory, or by a hand that meant
 * another one. What was committed is there again after its recovery. Returns how to end the watch.
 */
export function keepRunning(
  server: Server,
  folder: string,
  port: number,
  report: (line: string) => void,
): () => Promise<void> {
  let restarting: Promise<void> | null = null;
  let isOver = false;

  async function restart(): Promise<void> {
    const release = await holdLock(folder, 'cluster');
    try {
      if (isOver || findRunningPort(server.directory) !== null) return;
      report('The database ended unexpectedly: starting it again');
      await startServer(server, port);
    } catch (error) {
      report(`The database could not be started again: ${(error as Error).message}`);
    } finally {
      release();
    }
  }

  const timer = setInterval(() => {
    if (restarting || findRunningPort(server.directory) !== null) return;
    restarting = restart().finally(() => (restarting = null));
  }, lookEveryMs);
  timer.unref();
  return async () => {
    isOver = true;
    clearInterval(timer);
    await restarting;
  };
}
