import { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import { z } from 'zod';
import { idSchema } from '../../shared/contract/common';
import { doseReportFilterSchema, doseReportPageSchema } from '../../shared/contract/dose-report';
import {
  readAgainChosenSchema,
  readAgainFilterSchema,
  readAgainListSchema,
  readAgainPreviewSchema,
  readAgainResultSchema,
  readAgainResultsSchema,
} from '../../shared/contract/read-again';
import {
  archiveProgressFilterSchema,
  archiveProgressSchema,
  receivedFilesSchema,
} from '../../shared/contract/received-files';
import { receiveFiles, uploadedFiles } from '../http/receive-files';
import { readInput } from '../http/read-input';
import { route, type Route } from '../http/route';
import { downloadOriginal } from './download-original';
import { listDoseReports } from './list-dose-reports';
import { listReadAgain, readChosenAgain } from './list-read-again';
import { readAgain } from './read-again';
import { previewReadAgain } from './read-again-preview';
import { describeArchive } from './receive-archive';
import { receiveUploads } from './receive-uploads';

const params = z.object({ id: idSchema });

/** `Upload-Key`: a UUID of the sender's own for this file. `Prefer: respond-async` (RFC 7240): don't wait for archives. */
const sendingHeadersSchema = z.object({
  'Upload-Key': z.uuid('Give a UUID, one for each file.').nullable(),
  isAsync: z.boolean(),
});

export const doseReportRoutes: Route[] = [
  route({
    method: 'post',
    path: '/dose-reports',
    permission: 'dose-report.receive',
    summary:
      'Send dose reports or zip archives of them; an outcome for each file or entry, in order. 202: an archive is still being read',
    before: () => [receiveFiles('files')],
    multipart: 'files',
    response: receivedFilesSchema,
    handle: async ({ deps, actor, request, response }) => {
      const { isAsync, 'Upload-Key': uploadKey } = readInput(sendingHeadersSchema, {
        'Upload-Key': request.get('upload-key') ?? null,
        isAsync: /\brespond-async\b/.test(request.get('prefer') ?? ''),
      });
      const options = { uploadKey, isAsync, unpackedBytes: deps.env.archiveUnpackedBytes };
      const answer = await receiveUploads(deps.db, actor, uploadedFiles(request), options, deps.now());
      if (answer.archives.some(({ state }) => state === 'received')) response.status(202);
      return answer;
    },
  }),
  route({
    method: 'get',
    path: '/dose-reports',
    permission: 'dose-report.list',
    summary: 'Every file that came, newest first',
    query: doseReportFilterSchema,
    response: doseReportPageSchema,
    handle: ({ deps, actor, query }) => listDoseReports(deps.db, actor, query, deps.env.refusedKeepDays),
  }),
  route({
    method: 'get',
    path: '/dose-reports/archives/:id',
    permission: 'dose-report.receive',
    summary: 'How far an archive has been read, and the outcomes of its entries',
    params,
    query: archiveProgressFilterSchema,
    response: archiveProgressSchema,
    handle: ({ deps, actor, params: { id }, query: { after } }) => describeArchive(deps.db, actor, id, after),
  }),
  route({
    method: 'get',
    path: '/dose-reports/read-again',
    permission: 'dose-report.decide',
    summary: 'Kept files that an earlier reader read, or could not read',
    query: readAgainFilterSchema,
    response: readAgainListSchema,
    handle: ({ deps, actor, query }) => listReadAgain(deps.db, actor, query),
  }),
  route({
    method: 'post',
    path: '/dose-reports/read-again',
    permission: 'dose-report.decide',
    summary: 'Read chosen kept files again and take what changes',
    body: readAgainChosenSchema,
    response: readAgainResultsSchema,
    handle: async ({ deps, actor, body: { ids } }) => ({
      results: await readChosenAgain(deps.db, actor, ids, deps.now()),
    }),
  }),
  route({
    method: 'get',
    path: '/dose-reports/:id/original',
    permission: 'dose-report.download',
    summary: 'The bytes of a file as they came; of one that could not be unpacked, its archive',
    params,
    handle: async ({ deps, actor, params: { id }, response }) => {
      const { fileName, mediaType, parts } = await downloadOriginal(deps.db, actor, id);
      response.attachment(fileName).type(mediaType);
      await pipeline(Readable.from(parts), response);
    },
  }),
  route({
    method: 'get',
    path: '/dose-reports/:id/read-again',
    permission: 'dose-report.decide',
    summary: 'What would change if a kept file were read again; changes nothing',
    params,
    response: readAgainPreviewSchema,
    handle: ({ deps, actor, params: { id } }) => previewReadAgain(deps.db, actor.hospitalId, id),
  }),
  route({
    method: 'post',
    path: '/dose-reports/:id/read-again',
    permission: 'dose-report.receive',
    summary: 'Read a kept file again and take what changes',
    params,
    response: readAgainResultSchema,
    handle: ({ deps, actor, params: { id } }) => readAgain(deps.db, actor, id, deps.now()),
  }),
];
