import multer from 'multer';

/** Limits of one upload request; larger files and more of them come one request at a time. */
const megabyte = 1_048_576;

/** Files of a multipart field in memory: dose reports are a few megabytes at most. */
export const receiveFiles = (field: string) =>
  multer({
    storage: multer.memoryStorage(),
    limits: { fileSize: 64 * megabyte, files: 500, fields: 20 },
  }).array(field);
