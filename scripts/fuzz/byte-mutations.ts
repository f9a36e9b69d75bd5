import type { Random } from './random';

/** Changes a file; never the buffer it is given. Several follow one another, and the last one's size is bounded. */
export type Mutation = (bytes: Buffer, random: Random, other: Buffer) => Buffer;

const oddBytes = [0x00, 0x01, 0x1b, 0x20, 0x2d, 0x2e, 0x5c, 0x5e, 0x3d, 0x65, 0x7f, 0x80, 0xa0, 0xfe, 0xff];
const oddNumbers = [
  0, 1, 2, 7, 0x7f, 0x80, 0xff, 0x7fff, 0x8000, 0xffff, 0x7fffffff, 0x80000000, 0xfffffffe, 0xffffffff,
];

const flipBits: Mutation = (bytes, random) => {
  const changed = Buffer.from(bytes);
  for (let flips = random.skewed(16); flips > 0; flips -= 1) {
    const at = random.below(changed.length);
    changed[at] = (changed[at] ?? 0) ^ (1 << random.below(8));
  }
  return changed;
};

const setOddBytes: Mutation = (bytes, random) => {
  const changed = Buffer.from(bytes);
  for (let places = random.skewed(8); places > 0; places -= 1)
    changed[random.below(changed.length)] = random.pick(oddBytes);
  return changed;
};

const setOddNumber: Mutation = (bytes, random) => {
  const changed = Buffer.from(bytes);
  const number = random.pick(oddNumbers);
  const at = random.below(changed.length - 4);
  if (changed.length < 4) return changed;
  if (random.chance(0.5)) changed.writeUInt16LE(number & 0xffff, at);
  else if (random.chance(0.7)) changed.writeUInt32LE(number, at);
  else changed.writeUInt32BE(number, at);
  return changed;
};

const run = (bytes: Buffer, random: Random) => {
  const start = random.below(bytes.length);
  return { start, end: Math.min(bytes.length, start + random.skewed(random.chance(0.2) ? 20_000 : 400)) };
};

const cutEnd: Mutation = (bytes, random) => bytes.subarray(0, random.below(bytes.length));
const cutStart: Mutation = (bytes, random) => bytes.subarray(random.below(Math.min(bytes.length, 600)));

const cutOut: Mutation = (bytes, random) => {
  const { start, end } = run(bytes, random);
  return Buffer.concat([bytes.subarray(0, start), bytes.subarray(end)]);
};

const insertChance: Mutation = (bytes, random) => {
  const at = random.below(bytes.length + 1);
  const isUniform = random.chance(0.3);
  const uniform = random.pick(oddBytes);
  const inserted = Buffer.from(
    Array.from({ length: random.skewed(300) }, () => (isUniform ? uniform : random.below(256))),
  );
  return Buffer.concat([bytes.subarray(0, at), inserted, bytes.subarray(at)]);
};

const duplicate: Mutation = (bytes, random) => {
  const { start, end } = run(bytes, random);
  const times = random.chance(0.05) ? random.skewed(2000) : random.skewed(6);
  const at = random.chance(0.7) ? end : random.below(bytes.length);
  const piece = bytes.subarray(start, end);
  return Buffer.concat([bytes.subarray(0, at), ...Array<Buffer>(times).fill(piece), bytes.subarray(at)]);
};

const fill: Mutation = (bytes, random) => {
  const { start, end } = run(bytes, random);
  return Buffer.from(bytes).fill(random.pick(oddBytes), start, end);
};

/** The beginning of one file and the end of another. */
const splice: Mutation = (bytes, random, other) =>
  Buffer.concat([bytes.subarray(0, random.below(bytes.length)), other.subarray(random.below(other.length))]);

/** A run of one file into the midst of another. */
const transplant: Mutation = (bytes, random, other) => {
  const { start, end } = run(other, random);
  const at = random.below(bytes.length);
  return Buffer.concat([bytes.subarray(0, at), other.subarray(start, end), bytes.subarray(at)]);
};

export const byteMutations: Record<string, Mutation> = {
  flipBits,
  setOddBytes,
  setOddNumber,
  cutEnd,
  cutStart,
  cutOut,
  insertChance,
  duplicate,
  fill,
  splice,
  transplant,
};
