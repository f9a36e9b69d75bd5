import type { ReceivedArchive, ReceivedFile } from '../../../shared/contract/received-files';

/** One file on its way: waiting, leaving (share 0..1), its archive being read, answered, or not sent. */
export type Upload = {
  key: number;
  /** Tells the server that a second sending is the same one. */
  uploadKey: string;
  file: File;
  /** Where it lay in the folder that was handed over; its name otherwise. */
  path: string;
  state: 'waiting' | 'sending' | 'answered' | 'failed';
  share: number;
  /** One for a file; for an archive one for each entry that has its outcome. */
  results: readonly ReceivedFile[];
  archive: ReceivedArchive | null;
  failure: string | null;
};

/** What is learnt while a file is under way. */
export type UploadProgress = Partial<Pick<Upload, 'share' | 'results' | 'archive'>>;

/** Hands one file over and follows it to its outcome. */
export type Send = (
  upload: Pick<Upload, 'file' | 'uploadKey'>,
  onProgress: (progress: UploadProgress) => void,
) => Promise<Pick<Upload, 'results' | 'archive'>>;

export const isUnderWay = ({ state }: Upload): boolean => state === 'waiting' || state === 'sending';
