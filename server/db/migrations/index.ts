import { Foundation1764547200000 } from './1764547200000-foundation';
import { ExposureIndexes1796083200000 } from './1796083200000-exposure-indexes';
import { IntakeAndChecks1796169600000 } from './1796169600000-intake-and-checks';
import { ReceivedArchives1796170000000 } from './1796170000000-received-archives';
import { EntriesByHand1796173000000 } from './1796173000000-entries-by-hand';
import { SettledFigures1796256000000 } from './1796256000000-settled-figures';

/** In the order they run. */
export const migrations = [
  Foundation1764547200000,
  ExposureIndexes1796083200000,
  IntakeAndChecks1796169600000,
  ReceivedArchives1796170000000,
  EntriesByHand1796173000000,
  SettledFigures1796256000000,
];
