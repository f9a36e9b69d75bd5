import { ArchiveLine, isTrouble, isTroubled, PendingLine, ResultLine } from './upload-line';
import type { Upload } from './upload.types';

/** The files handed over, an archive above its entries; or only those that somebody has to look at. */
export const UploadList = ({
  items,
  isTroubleOnly,
}: {
  items: readonly Upload[];
  isTroubleOnly: boolean;
}) => (
  <ul
    className="flex max-h-[28rem] flex-col gap-2 overflow-y-auto"
    tabIndex={0}
    aria-label="Files and their outcomes"
  >
    {items.filter((item) => !isTroubleOnly || isTrouble(item)).map((item) => linesOf(item, isTroubleOnly))}
  </ul>
);

function linesOf(item: Upload, isTroubleOnly: boolean) {
  const { key, path, results, archive } = item;
  if (results.length === 0 && archive === null) return <PendingLine key={key} item={item} />;
  const isWhole = archive === null || archive.state === 'refused';
  const lines = results.map((result, index) =>
    isTroubleOnly && !isTroubled(result) ? null : (
      <ResultLine key={`${key}/${index}`} path={isWhole ? path : result.fileName} result={result} />
    ),
  );
  return isWhole ? lines : [<ArchiveLine key={key} item={item} />, ...lines];
}
