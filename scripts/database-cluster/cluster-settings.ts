import { statfsSync } from 'node:fs';

export type ClusterMode = 'durable' | 'throw-away';

const roomySharedMemoryBytes = 512 * 1024 * 1024;

function hasTinySharedMemory(): boolean {
  try {
    const { bsize, blocks } = statfsSync('/dev/shm');
    return bsize * blocks < roomySharedMemoryBytes;
  } catch {
    return true;
  }
}

/** The server's settings: reached over loopback only; a throw-away cluster may forget everything. */
export function listSettings(mode: ClusterMode): string[] {
  return [
    'listen_addresses=127.0.0.1',
    'unix_socket_directories=',
    'timezone=UTC',
    'log_timezone=UTC',
    'shared_buffers=256MB',
    // Containers often have 64 MB of /dev/shm, too little for a parallel query.
    ...(hasTinySharedMemory() ? ['dynamic_shared_memory_type=mmap'] : []),
    // Nobody vacuums what is dropped in a minute; a vacuum under way would hold up its dropping.
    ...(mode === 'throw-away'
      ? ['fsync=off', 'synchronous_commit=off', 'full_page_writes=off', 'autovacuum=off']
      : []),
  ];
}
