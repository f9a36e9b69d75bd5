// Source: the code dictionaries of PS3.16 as pydicom 2.3.1 carries them (pydicom.sr).
import { fileURLToPath } from 'node:url';
import { beforeAll, describe, expect, it } from 'vitest';
import * as tables from '../../server/dicom/coded-values.table-data';
import { concepts, type CodeEntry } from '../../server/dicom/concepts.table-data';
import { runTool } from './reader-comparison';

interface Dictionary {
  meanings: Record<string, Record<string, string[]>>;
  fromSrt: Record<string, string>;
}

const script = fileURLToPath(new URL('data/dump-code-meanings.py', import.meta.url));
let dictionary: Dictionary;
beforeAll(() => {
  dictionary = JSON.parse(runTool('/usr/bin/python3', [script])) as Dictionary;
});

const values: Record<string, CodeEntry> = Object.assign({}, ...Object.values(tables));
const entries = Object.entries<CodeEntry>({ ...concepts, ...values });

/** Meanings that the dictionary words otherwise than PS3.16's template tables; the code is what counts. */
const wordedOtherwise: Record<string, string> = {
  hasIntent: 'Has intent (attribute)',
  accumulatedGlandular: 'Accumulated Average Glandular Dose (mammo)',
  ct: 'Computerized axial tomography (procedure)',
};

/** Newer than this dictionary (TID 10040, PS3.16 2023): codes from memory, only used to recognise such reports. */
const newer = ['enhancedAccumulated', 'enhancedDetails'];

describe('concept codes', () => {
  it.each(entries.filter(([name]) => !newer.includes(name)))(
    '%s has the meaning that the dictionary gives its code',
    (name, [scheme, value, meaning]) => {
      const known = dictionary.meanings[scheme]?.[value]?.map((one) => one.toLowerCase());
      expect(known).toContain((wordedOtherwise[name] ?? meaning).toLowerCase());
    },
  );

  it.each(newer)('%s is not yet in the dictionary, else it must be checked like the others', (name) => {
    const [scheme, value] = concepts[name as keyof typeof concepts];
    expect(dictionary.meanings[scheme]?.[value]).toBeUndefined();
  });

  it.each(entries.filter(([, entry]) => entry[3] !== undefined))(
    '%s has the SNOMED-RT code that maps to its SNOMED-CT code',
    (_name, [, value, , srtValue]) => {
      expect(dictionary.fromSrt[srtValue ?? '']).toBe(value);
    },
  );
});
