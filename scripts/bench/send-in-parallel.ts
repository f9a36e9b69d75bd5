import { sendReport } from './send-report';

/** As the page sends them. */
export const inFlight = 3;

/** Sends so many reports, each as it is made, three at a time; throws unless each became a procedure of its own. */
export async function sendInParallel(
  url: string,
  cookie: string,
  fileCount: number,
  makeFile: (index: number) => Uint8Array<ArrayBuffer>,
): Promise<void> {
  const procedureIds = new Set<string>();
  let sent = 0;
  const sendOn = async () => {
    while (sent < fileCount) {
      const file = makeFile(sent++);
      const { procedureId } = await sendReport(url, cookie, file);
      if (procedureId) procedureIds.add(procedureId);
    }
  };
  await Promise.all(Array.from({ length: inFlight }, sendOn));
  if (procedureIds.size !== fileCount) throw new Error(`${procedureIds.size} procedures came of it`);
}
