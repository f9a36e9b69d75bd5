import { z } from 'zod';
import { idSchema } from '../../shared/contract/common';
import {
  doseReportFilterSchema,
  doseReportPageSchema,
  receivedFileSchema,
  receivedFilesSchema,
} from '../../shared/contract/dose-report';
import { receiveFiles } from '../http/receive-files';
import { route, type Route } from '../http/route';
import { downloadOriginal } from './download-original';
import { listDoseReports } from './list-dose-reports';
import { readAgain } from './read-again';
import { receiveUploads } from './receive-uploads';

const params = z.object({ id: idSchema });

export const doseReportRoutes: Route[] = [
  route({
    method: 'post',
    path: '/dose-reports',
    permission: 'dose-report.receive',
    summary: 'Send dose reports; an outcome for each file, in the order of the files',
    before: () => [receiveFiles('files')],
    multipart: 'files',
    response: receivedFilesSchema,
    handle: async ({ deps, actor, request }) => ({
      results: await receiveUploads(
        deps.db,
        actor,
        (request.files ?? []) as Express.Multer.File[],
        deps.now(),
      ),
    }),
  }),
  route({
    method: 'get',
    path: '/dose-reports',
    permission: 'dose-report.list',
    summary: 'Every file that came, newest first',
    query: doseReportFilterSchema,
    response: doseReportPageSchema,
    handle: ({ deps, actor, query }) => listDoseReports(deps.db, actor, query),
  }),
  route({
    method: 'get',
    path: '/dose-reports/:id/original',
    permission: 'dose-report.download',
    summary: 'The bytes of a file as they came',
    params,
    handle: async ({ deps, actor, params: { id }, response }) => {
      const { fileName, bytes } = await downloadOriginal(deps.db, actor, id);
      response.attachment(fileName).type('application/dicom').send(bytes);
    },
  }),
  route({
    method: 'post',
    path: '/dose-reports/:id/read-again',
    permission: 'dose-report.receive',
    summary: 'Read a kept file again',
    params,
    response: receivedFileSchema,
    handle: ({ deps, actor, params: { id } }) => readAgain(deps.db, actor, id, deps.now()),
  }),
];
