import type { Fault, Tally } from './tally';

/** The reading process, its loader and its share of the samples together. */
export const maxMemoryMb = 300;
const shownFaults = 20;

const count = (value: number) => value.toLocaleString('en');

/** "12,000 of 200,000: read 3,120, truncated 2,871, …; slowest 41 ms (case 77); memory 148 MB; faults 0". */
export function describeProgress(tally: Tally, all: number, memoryMb: number): string {
  const results = Object.entries(tally.results).toSorted(([, one], [, other]) => other - one);
  return [
    `${count(tally.cases)} of ${count(all)}: ${results.map(([name, many]) => `${name} ${count(many)}`).join(', ')}`,
    `slowest ${tally.slowest.tookMs.toFixed(0)} ms (case ${tally.slowest.caseNumber})`,
    `memory ${memoryMb.toFixed(0)} MB`,
    `faults ${count(tally.faults.length)}`,
  ].join('; ');
}

/** The faults, one line each, those of one kind and detail once. */
export function describeFaults({ faults }: Tally, seed: number): string[] {
  const alike = new Map<string, Fault[]>();
  for (const fault of faults) {
    const name = `${fault.kind}: ${fault.detail}`;
    alike.set(name, [...(alike.get(name) ?? []), fault]);
  }
  return [...alike].slice(0, shownFaults).map(([name, list]) => {
    const first = list[0];
    const repeat = `npm run fuzz -- --seed ${seed} --case ${first?.caseNumber}`;
    return `${name} (${list.length} times; ${repeat}; ${first?.description})`;
  });
}
