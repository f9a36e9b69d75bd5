import type { Mutation } from './byte-mutations';
import { findLandmarks, longForms, valueRepresentations, type Landmark } from './landmarks';
import type { Random } from './random';

type ElementMutation = (bytes: Buffer, landmarks: Landmark[], random: Random) => Buffer;

/** Without any landmark a file stays as it is; other mutations change it. */
const atElements =
  (mutate: ElementMutation): Mutation =>
  (bytes, random) => {
    const landmarks = findLandmarks(bytes);
    return landmarks.length === 0 ? bytes : mutate(bytes, landmarks, random);
  };

const concat = (bytes: Buffer, at: number, ...inserted: Buffer[]) =>
  Buffer.concat([bytes.subarray(0, at), ...inserted, bytes.subarray(at)]);

const editLength: ElementMutation = (bytes, landmarks, random) => {
  const changed = Buffer.from(bytes);
  const { lengthAt, lengthBytes } = random.pick(landmarks);
  if (lengthAt + lengthBytes > bytes.length) return changed;
  const length = changed.readUIntLE(lengthAt, lengthBytes);
  const most = lengthBytes === 2 ? 0xffff : 0xffffffff;
  const wanted = random.pick([
    ...[0, 1, 2, 3, 0xfffe, most, most - 1, most >>> 1, length + 1, length + 2, length - 1, length - 2],
    ...[length * 2, bytes.length - lengthAt, bytes.length, random.below(bytes.length), random.bits()],
  ]);
  const written = Math.min(Math.max(wanted, 0), most);
  if (random.chance(0.85)) changed.writeUIntLE(written, lengthAt, lengthBytes);
  else changed.writeUIntBE(written, lengthAt, lengthBytes);
  return changed;
};

const tags = [
  ...[
    0xfffee000, 0xfffee00d, 0xfffee0dd, 0x00020000, 0x00020010, 0x00080005, 0x00080016, 0x00080018,
    0x00080201,
  ],
  ...[
    0x00100010, 0x0020000d, 0x0040a010, 0x0040a040, 0x0040a043, 0x0040a160, 0x0040a168, 0x0040a300,
    0x0040a30a,
  ],
  ...[
    0x0040a491, 0x0040a504, 0x0040a730, 0x0040db00, 0x00400008, 0x0040db73, 0x00090010, 0x00091001,
    0x7fe00010,
  ],
];

const editTag: ElementMutation = (bytes, landmarks, random) => {
  const changed = Buffer.from(bytes);
  const { at } = random.pick(landmarks);
  if (random.chance(0.5)) {
    changed.copy(changed, at, random.pick(landmarks).at, random.pick(landmarks).at + 4);
    return changed;
  }
  const tag = random.pick(tags);
  if (random.chance(0.1)) changed.writeUInt32BE(tag, at);
  else {
    changed.writeUInt16LE(tag >>> 16, at);
    changed.writeUInt16LE(tag & 0xffff, at + 2);
  }
  return changed;
};

const editValueRepresentation: ElementMutation = (bytes, landmarks, random) => {
  const explicit = landmarks.filter(({ valueRepresentation }) => valueRepresentation !== null);
  if (explicit.length === 0) return bytes;
  const changed = Buffer.from(bytes);
  changed.write(random.pick(valueRepresentations), random.pick(explicit).at + 4, 'latin1');
  return changed;
};

const range = (landmarks: Landmark[], random: Random) => {
  const first = random.below(landmarks.length);
  const last = Math.min(landmarks.length - 1, first + random.skewed(60));
  return { start: landmarks[first]?.at ?? 0, end: landmarks[last]?.at ?? 0 };
};

const dropElements: ElementMutation = (bytes, landmarks, random) => {
  const { start, end } = range(landmarks, random);
  return Buffer.concat([bytes.subarray(0, start), bytes.subarray(end)]);
};

const copyElements: ElementMutation = (bytes, landmarks, random) => {
  const { start, end } = range(landmarks, random);
  const times = random.chance(0.1) ? random.skewed(3000) : random.skewed(4);
  return concat(bytes, random.pick(landmarks).at, ...Array<Buffer>(times).fill(bytes.subarray(start, end)));
};

const moveElements: ElementMutation = (bytes, landmarks, random) => {
  const { start, end } = range(landmarks, random);
  const rest = Buffer.concat([bytes.subarray(0, start), bytes.subarray(end)]);
  return concat(rest, Math.min(random.pick(landmarks).at, rest.length), bytes.subarray(start, end));
};

const undefinedLength = 0xffffffff;

/** A header of an item or sequence in little endian; explicit with a value representation. */
export function header(tag: number, length: number, valueRepresentation: string | null): Buffer {
  const written = Buffer.alloc(valueRepresentation === null ? 8 : 12);
  written.writeUInt16LE(tag >>> 16, 0);
  written.writeUInt16LE(tag & 0xffff, 2);
  if (valueRepresentation !== null) written.write(valueRepresentation, 4, 'latin1');
  written.writeUInt32LE(length, written.length - 4);
  return written;
}

/** Puts a stretch of elements into sequences of items, one in another, closed or left open. */
const nest: ElementMutation = (bytes, landmarks, random) => {
  const { start, end } = range(landmarks, random);
  const depth = random.chance(0.3) ? random.skewed(3000) : random.skewed(80);
  const explicit = landmarks.some(({ valueRepresentation }) => valueRepresentation !== null);
  const opening = Buffer.concat([
    header(random.chance(0.8) ? 0x0040a730 : random.pick(tags), undefinedLength, explicit ? 'SQ' : null),
    header(0xfffee000, undefinedLength, null),
  ]);
  const closing = Buffer.concat([header(0xfffee00d, 0, null), header(0xfffee0dd, 0, null)]);
  const closings = random.chance(0.7) ? depth : random.below(depth + 1);
  return Buffer.concat([
    bytes.subarray(0, start),
    ...Array<Buffer>(depth).fill(opening),
    bytes.subarray(start, end),
    ...Array<Buffer>(closings).fill(closing),
    bytes.subarray(end),
  ]);
};

const insertEmpty: ElementMutation = (bytes, landmarks, random) => {
  const valueRepresentation = random.chance(0.6) ? random.pick([...longForms]) : null;
  const length = random.pick([0, 0, 1, 8, undefinedLength]);
  return concat(bytes, random.pick(landmarks).at, header(random.pick(tags), length, valueRepresentation));
};

export const elementMutations: Record<string, Mutation> = {
  editLength: atElements(editLength),
  editTag: atElements(editTag),
  editValueRepresentation: atElements(editValueRepresentation),
  dropElements: atElements(dropElements),
  copyElements: atElements(copyElements),
  moveElements: atElements(moveElements),
  nest: atElements(nest),
  insertEmpty: atElements(insertEmpty),
};
