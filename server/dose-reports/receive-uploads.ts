import type { ReceivedFile } from '../../shared/contract/dose-report';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { Problem } from '../kernel/problem';
import { receiveDoseReport } from './receive-dose-report';

type Upload = { originalname: string; buffer: Buffer };

/** Busboy hands names over as Latin-1; browsers send UTF-8. */
const nameOf = (upload: Upload) => Buffer.from(upload.originalname, 'latin1').toString('utf8') || 'unnamed';

/** The files of one request, one after another, answered in their order. */
export async function receiveUploads(
  db: Db,
  actor: Actor,
  uploads: Upload[],
  now: Date,
): Promise<ReceivedFile[]> {
  if (uploads.length === 0)
    throw new Problem('invalid-input', 'No file came. Send one or more in the field "files".', {
      issues: [{ pointer: '/files', detail: 'Choose at least one file.' }],
    });
  const results: ReceivedFile[] = [];
  for (const upload of uploads)
    results.push(
      await receiveDoseReport(
        db,
        {
          hospitalId: actor.hospitalId,
          receivedById: actor.id,
          channel: 'page',
          fileName: nameOf(upload),
          bytes: upload.buffer,
        },
        now,
      ),
    );
  return results;
}
