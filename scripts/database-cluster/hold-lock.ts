import { createHash } from 'node:crypto';
import { realpathSync } from 'node:fs';
import { createServer, type Server } from 'node:net';
import { setTimeout as pause } from 'node:timers/promises';

const retryMs = 150;

/** A short name for a folder that two checkouts side by side do not share. */
export function hashFolder(folder: string): string {
  return createHash('sha256').update(realpathSync(folder)).digest('hex').slice(0, 12);
}

function listen(address: string): Promise<Server | null> {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', (error: NodeJS.ErrnoException) =>
      error.code === 'EADDRINUSE' ? resolve(null) : reject(error),
    );
    server.listen(address, () => {
      server.unref();
      resolve(server);
    });
  });
}

/**
 * Waits until no other process holds `purpose` for this folder, then holds it.
 * The lock is a socket in Linux's abstract namespace: the kernel lets go of it when the holder
 * dies, so a killed process never leaves a lock behind.
 * Returns the function that lets go; `onWait` is called once if somebody else holds it.
 */
export async function holdLock(
  folder: string,
  purpose: string,
  onWait: () => void = () => undefined,
): Promise<() => void> {
  const address = `\0leeward-${purpose}-${hashFolder(folder)}`;
  let hasWaited = false;
  for (;;) {
    const server = await listen(address);
    if (server) return () => void server.close();
    if (!hasWaited) onWait();
    hasWaited = true;
    await pause(retryMs);
  }
}
