import { readFileSync } from 'node:fs';
import { resolve } from 'node:path';
import { readDoseReport } from '../server/dicom/read-dose-report';
import { toPrintedReport } from '../shared/contract/report';

interface PrintedLine {
  file: string;
  outcome: 'read' | 'refused';
  reason: { code: string; detail: string } | null;
  report: ReturnType<typeof toPrintedReport> | null;
}

/** npm runs scripts in the project's folder and keeps the caller's one here: paths are meant from there. */
const callerFolder = process.env['INIT_CWD'] ?? process.cwd();

/** One line for a file; a held file prints as refused with its own code. */
function readLine(file: string): PrintedLine {
  let bytes: Uint8Array;
  try {
    bytes = readFileSync(resolve(callerFolder, file));
  } catch (error) {
    const detail = error instanceof Error ? error.message : String(error);
    return { file, outcome: 'refused', reason: { code: 'file-unreadable', detail }, report: null };
  }
  const reading = readDoseReport(bytes);
  if (reading.outcome !== 'read') return { file, outcome: 'refused', reason: reading.reason, report: null };
  return { file, outcome: 'read', reason: null, report: toPrintedReport(reading.report, reading.warnings) };
}

const files = process.argv.slice(2);
if (files.length === 0) {
  process.stderr.write('Usage: npm run --silent read-report -- FILE...\n');
  process.exitCode = 1;
}
for (const file of files) {
  const line = readLine(file);
  process.stdout.write(`${JSON.stringify(line)}\n`);
  if (line.outcome !== 'read') process.exitCode = 1;
}
