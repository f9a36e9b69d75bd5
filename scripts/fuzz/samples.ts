import { readdirSync, readFileSync } from 'node:fs';

export interface Sample {
  name: string;
  bytes: Buffer;
  /** Where the deflated data set begins; null for a sample that is not deflated. */
  dataSetStart: number | null;
}

const deflatedSyntax = '1.2.840.10008.1.2.1.99';

/** Behind the transfer syntax follow the implementation's UID and name, then the data set: group 2 tells its length. */
function findDeflatedDataSet(bytes: Buffer): number | null {
  const groupLength = bytes.indexOf(Buffer.from([0x02, 0x00, 0x00, 0x00, 0x55, 0x4c, 0x04, 0x00]));
  if (groupLength < 0 || !bytes.subarray(0, 2048).includes(deflatedSyntax)) return null;
  return groupLength + 12 + bytes.readUInt32LE(groupLength + 8);
}

/** Every DICOM file of the samples' folder, in the order of their names. */
export const loadSamples = (folder = 'samples'): Sample[] =>
  readdirSync(folder)
    .filter((name) => name.endsWith('.dcm'))
    .sort()
    .map((name) => {
      const bytes = readFileSync(`${folder}/${name}`);
      return { name, bytes, dataSetStart: findDeflatedDataSet(bytes) };
    });
