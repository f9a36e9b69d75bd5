import { readdirSync, readFileSync } from 'node:fs';

/** Names of the sample dose reports that are to be read, in their order. */
export const sampleNames = (): string[] =>
  readdirSync('samples')
    .filter((name) => name.endsWith('.expected.json'))
    .filter((name) => JSON.parse(readFileSync(`samples/${name}`, 'utf8')).outcome === 'read')
    .map((name) => name.replace('.expected.json', '.dcm'));

export const readSample = (name: string): Buffer => readFileSync(`samples/${name}`);
