import type { Db } from '../db/db';
import { insertLevels } from './level.store';

const source =
  'NCRP Report 168 and SIR guideline (Stecker 2009), from memory; to be confirmed by the department’s physicist';

/**
 * Levels a new hospital starts with: first notification and substantial level for reference air kerma (Gy),
 * kerma-area product (Gy·cm²) and fluoroscopy time (s). A department's own policy replaces them.
 */
export const addDefaultLevels = (db: Db, hospitalId: string): Promise<void> =>
  insertLevels(
    db,
    hospitalId,
    [
      { quantity: 'reference-air-kerma', strength: 'notify', value: 3 },
      { quantity: 'reference-air-kerma', strength: 'act', value: 5 },
      { quantity: 'kerma-area-product', strength: 'notify', value: 300 },
      { quantity: 'kerma-area-product', strength: 'act', value: 500 },
      { quantity: 'fluoroscopy-time', strength: 'notify', value: 30 * 60 },
      { quantity: 'fluoroscopy-time', strength: 'act', value: 60 * 60 },
    ].map((level) => ({ ...level, source, validFrom: '2000-01-01' })) as Parameters<typeof insertLevels>[2],
  );
