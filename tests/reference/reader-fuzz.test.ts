import { expect, it } from 'vitest';
import { readDoseReport } from '../../server/dicom/read-dose-report';
import { describeFaults } from '../../scripts/fuzz/print-tally';
import { runCase } from '../../scripts/fuzz/run-cases';
import { loadSamples } from '../../scripts/fuzz/samples';
import { emptyTally } from '../../scripts/fuzz/tally';

const seed = 20_261_201;
const cases = 3000;

/** The short form of `npm run fuzz`; that a fault is found when there is one, scripts/fuzz/judge.test.ts shows. */
it(`${cases} spoilt files are read, held or refused, none slowly and none against the contract`, () => {
  const samples = loadSamples();
  const tally = emptyTally();
  for (let number = 0; number < cases; number += 1) runCase(tally, readDoseReport, samples, seed, number);
  expect(describeFaults(tally, seed)).toEqual([]);
  // Spoiling must leave some whole and break others in many ways, or nothing is tested.
  expect(tally.results['read']).toBeGreaterThan(cases / 20);
  expect(Object.keys(tally.results).length).toBeGreaterThan(10);
}, 120_000);
