import { mkdtemp, open, rm, type FileHandle } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/** A file without a name: its space is given back when it is closed, or when the process ends in any way. */
export async function openNamelessFile(): Promise<FileHandle> {
  const folder = await mkdtemp(join(tmpdir(), 'leeward-'));
  try {
    return await open(join(folder, 'content'), 'wx+', 0o600);
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}
