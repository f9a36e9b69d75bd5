import { paths } from '../../paths';
import { outcomeNames } from './describe-uploads';
import type { Upload } from './upload.types';

/** A cell of the list: quoted, and never taken for a formula by a spreadsheet. */
const cell = (value: string): string => {
  const plain = /^[=+\-@\t\r]/.test(value) ? `'${value}` : value;
  return /[",;\r\n]/.test(plain) ? `"${plain.replaceAll('"', '""')}"` : plain;
};

const head = ['File', 'Archive', 'Outcome', 'Reason code', 'Reason', 'Procedure'];

/** What became of every file, as comma-separated values (RFC 4180); `origin` makes the links whole. */
export function writeOutcomeList(uploads: readonly Upload[], origin: string): string {
  const rows = uploads.flatMap((upload) => {
    if (upload.results.length === 0)
      return [
        [upload.path, '', upload.state === 'failed' ? 'not sent' : 'under way', '', upload.failure ?? '', ''],
      ];
    return upload.results.map(({ fileName, archiveName, outcome, reason, procedureId }) => [
      upload.archive === null ? upload.path : fileName,
      archiveName ?? '',
      outcomeNames[outcome],
      reason?.code ?? '',
      reason?.detail ?? '',
      procedureId ? `${origin}${paths.procedure(procedureId)}` : '',
    ]);
  });
  const skipped = uploads.flatMap(({ archive }) =>
    (archive?.skipped ?? []).map(({ path, reason }) => [
      path,
      archive?.fileName ?? '',
      'skipped',
      '',
      reason,
      '',
    ]),
  );
  return [head, ...rows, ...skipped].map((row) => row.map(cell).join(',')).join('\r\n') + '\r\n';
}
