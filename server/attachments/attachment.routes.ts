import { keptAttachmentSchema, largestPictureBytes } from '../../shared/contract/attachment';
import { receiveOneFile } from '../http/receive-one-file';
import { route, type Route } from '../http/route';
import { keepPicture } from './keep-picture';

/** Busboy hands names over as Latin-1; browsers send UTF-8. */
const nameOf = (file: Express.Multer.File) =>
  Buffer.from(file.originalname, 'latin1').toString('utf8') || 'unnamed';

export const attachmentRoutes: Route[] = [
  route({
    method: 'post',
    path: '/attachments',
    permission: 'procedure.enter-by-hand',
    summary: 'Keep a picture of a dose screen for an entry by hand',
    before: () => [receiveOneFile('photo', largestPictureBytes)],
    multipart: 'photo',
    response: keptAttachmentSchema,
    status: 201,
    handle: ({ deps, actor, request: { file } }) =>
      keepPicture(deps.db, actor, file ? { fileName: nameOf(file), bytes: file.buffer } : null),
  }),
];
