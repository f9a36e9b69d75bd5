import { deflateRawSync, inflateRawSync } from 'node:zlib';
import { mutationFamilies } from './mutations';
import { Random } from './random';
import type { Sample } from './samples';

/** Files beyond it are cut: what is read at once, on the thread of a request, is no larger either. */
export const maxBytes = 1_000_000;

export interface FuzzCase {
  bytes: Buffer;
  /** What was done to which sample: "07-deflated.dcm: inflated, editLength, cutEnd". */
  description: string;
}

const families = mutationFamilies.map((family) => Object.entries(family));
const bounded = (bytes: Buffer) => (bytes.length > maxBytes ? bytes.subarray(0, maxBytes) : bytes);

/** Short samples far more often than long ones: what matters in a long one is in a short one too. */
function pickSample(samples: readonly Sample[], random: Random): Sample {
  for (;;) {
    const sample = random.pick(samples);
    if (random.chance(Math.min(1, 16_000 / (sample.bytes.length + 1)))) return sample;
  }
}

/** A file longer than the bound loses its middle. */
function shorten(bytes: Buffer): Buffer {
  if (bytes.length <= maxBytes) return bytes;
  const half = maxBytes / 2 - 1;
  return Buffer.concat([bytes.subarray(0, half), bytes.subarray(bytes.length - half)]);
}

function mutate(bytes: Buffer, samples: readonly Sample[], random: Random, done: string[]): Buffer {
  let mutated = bytes;
  for (let times = random.skewed(6); times > 0; times -= 1) {
    const [name, mutation] = random.pick(random.pick(families));
    mutated = bounded(mutation(mutated, random, bounded(pickSample(samples, random).bytes)));
    done.push(name);
  }
  return mutated;
}

/** The data set behind a meta header that says it is deflated; null where there is none. */
function inflate({ bytes, dataSetStart }: Sample): Buffer | null {
  if (dataSetStart === null) return null;
  try {
    return inflateRawSync(bytes.subarray(dataSetStart), { maxOutputLength: maxBytes });
  } catch {
    // The samples hold one that unpacks to far more, on purpose: it is spoilt as it is.
    return null;
  }
}

/** The spoilt file of a number: always the same for the same seed and samples. */
export function makeCase(samples: readonly Sample[], seed: number, caseNumber: number): FuzzCase {
  const random = new Random(seed, caseNumber);
  const sample = pickSample(samples, random);
  const done: string[] = [];
  const inflated = random.chance(0.7) ? inflate(sample) : null;
  if (inflated === null || sample.dataSetStart === null) {
    const bytes = mutate(shorten(sample.bytes), samples, random, done);
    return { bytes, description: `${sample.name}: ${done.join(', ')}` };
  }
  const spoilt = deflateRawSync(mutate(inflated, samples, random, done), { level: 1 });
  const bytes = bounded(Buffer.concat([sample.bytes.subarray(0, sample.dataSetStart), spoilt]));
  return { bytes, description: `${sample.name}: inflated, ${done.join(', ')}` };
}
