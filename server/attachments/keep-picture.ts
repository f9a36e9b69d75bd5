import { createHash } from 'node:crypto';
import type { KeptAttachment } from '../../shared/contract/attachment';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { fieldProblem } from '../kernel/field-problem';
import { addAttachment, dropUnusedPictures } from './attachment.store';
import { isHeic, readPicture } from './read-picture';

/** How long a picture waits for the entry it was taken for. */
const unusedDays = 7;

const wordsFor = (bytes: Buffer) =>
  isHeic(bytes)
    ? 'This picture is in the HEIC format, which not every screen can show. Take it as JPEG (on an iPhone: Settings, Camera, Formats, Most Compatible).'
    : 'This is no picture that can be shown. Choose a JPEG, PNG or WebP.';

/** Keeps a picture of the dose screen, without place and time of taking, until an entry refers to it. */
export async function keepPicture(
  db: Db,
  actor: Actor,
  upload: { fileName: string; bytes: Buffer } | null,
): Promise<KeptAttachment> {
  if (!upload) throw fieldProblem({ pointer: '/photo', detail: 'Choose a picture.' });
  const picture = readPicture(upload.bytes);
  if (!picture) throw fieldProblem({ pointer: '/photo', detail: wordsFor(upload.bytes) });
  await dropUnusedPictures(db, actor.hospitalId, unusedDays);
  const { mediaType, bytes } = picture;
  const fileName = upload.fileName.slice(0, 255);
  const id = await addAttachment(db, {
    hospitalId: actor.hospitalId,
    createdById: actor.id,
    purpose: 'dose-screen',
    fileName,
    mediaType,
    sha256: createHash('sha256').update(bytes).digest('hex'),
    byteCount: bytes.length,
    bytes,
  });
  return { id, fileName, mediaType, byteCount: bytes.length };
}
