import { basicSamples } from './basic-samples';
import { characterSetSamples } from './character-set-samples';
import { codeSamples } from './code-samples';
import { encodingSamples } from './encoding-samples';
import { numberSamples } from './number-samples';
import type { Sample } from './sample';
import { severalReportSamples } from './several-report-samples';
import { structureSamples } from './structure-samples';
import { systemSamples } from './system-samples';
import { timeSamples } from './time-samples';

/** The samples that the reader reads, by what they vary. */
export function readableGroups(): Record<string, Sample[]> {
  return {
    'Rooms, encodings and common deviations': basicSamples(),
    'Files and transfer syntaxes': encodingSamples(),
    'Character sets': characterSetSamples(),
    'Numbers and units': numberSamples(),
    'Dates and times': timeSamples(),
    'Shape of the tree and texts': structureSamples(),
    Codes: codeSamples(),
    'Kinds of system and content': systemSamples(),
    'Several reports of a study': severalReportSamples(),
  };
}

/** Every sample that the reader reads. */
export function readableSamples(): Sample[] {
  return Object.values(readableGroups()).flat();
}
