import { receivedFilesSchema, type ReceivedFile } from '../../shared/contract/received-files';

/** Hands one file over as the page does; it is committed when the answer comes. Throws unless it was stored. */
export async function sendReport(
  url: string,
  cookie: string,
  bytes: Uint8Array<ArrayBuffer>,
): Promise<ReceivedFile> {
  const form = new FormData();
  form.append('files', new Blob([bytes]), 'report.dcm');
  const response = await fetch(`${url}/api/dose-reports`, {
    method: 'POST',
    headers: { cookie },
    body: form,
  });
  if (!response.ok) throw new Error(`The server answered ${response.status}: ${await response.text()}`);
  const [result] = receivedFilesSchema.parse(await response.json()).results;
  if (result?.outcome !== 'stored') throw new Error(`Not stored: ${JSON.stringify(result)}`);
  return result;
}
