import multer from 'multer';

/** One file of a multipart field in memory, up to a size of the caller's. */
export const receiveOneFile = (field: string, fileSize: number) =>
  multer({ storage: multer.memoryStorage(), limits: { fileSize, files: 1, fields: 0 } }).single(field);
