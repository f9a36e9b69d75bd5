import type { Request } from 'express';
import multer from 'multer';
import type { UploadedContent, UploadedFile } from '../kernel/uploaded-file';
import { maxArchiveBytes, uploadStorage } from './upload-storage';

/** Files of a multipart field; larger ones and more of them come one request at a time. */
export const receiveFiles = (field: string) =>
  multer({
    storage: uploadStorage,
    limits: { fileSize: maxArchiveBytes, files: 500, fields: 20 },
  }).array(field);

/** Busboy hands names over as Latin-1; browsers send UTF-8. */
const nameOf = (originalName: string) => Buffer.from(originalName, 'latin1').toString('utf8') || 'unnamed';

/** The files that `receiveFiles` took in, in their order. */
export const uploadedFiles = (request: Request): UploadedFile[] =>
  ((request.files ?? []) as Express.Multer.File[]).map((file) => ({
    fileName: nameOf(file.originalname),
    content: (file as unknown as { content: UploadedContent }).content,
  }));
