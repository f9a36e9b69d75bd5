import { readFileSync } from 'node:fs';
import { readDoseReport } from '../../server/dicom/read-dose-report';

// Run as a program of its own by a figure on memory: reads one file and prints how much memory that added, in MB.
const [path = ''] = process.argv.slice(2);
const bytes = readFileSync(path);
const beforeKb = process.resourceUsage().maxRSS;
const reading = readDoseReport(bytes);
if (reading.outcome !== 'read') throw new Error(`Not read: ${reading.reason.code}`);
process.stdout.write(String((process.resourceUsage().maxRSS - beforeKb) / 1024));
