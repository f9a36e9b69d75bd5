import type { Mutation } from './byte-mutations';
import { header } from './element-mutations';
import { findLandmarks } from './landmarks';
import type { Random } from './random';

const characterSets = [
  ...[
    'ISO_IR 6',
    'ISO_IR 100',
    'ISO_IR 101',
    'ISO_IR 144',
    'ISO_IR 127',
    'ISO_IR 166',
    'ISO_IR 13',
    'ISO_IR 192',
  ],
  ...[
    'ISO 2022 IR 6',
    'ISO 2022 IR 13',
    'ISO 2022 IR 58',
    'ISO 2022 IR 87',
    'ISO 2022 IR 149',
    'ISO 2022 IR 159',
  ],
  ...['GB18030', 'GBK', '', ' ', 'ISO_IR', 'ISO 2022 IR 999', 'UTF-8', 'isø ir 192'],
];

const characterSetTag = Buffer.from([0x08, 0x00, 0x05, 0x00]);

/** Declares other character sets, one or several, in place of the declaration or before the first element. */
const declareCharacterSet: Mutation = (bytes, random) => {
  const names = Array.from({ length: random.skewed(6) }, () => random.pick(characterSets));
  const text = Buffer.from(names.join('\\'), 'latin1');
  const element = Buffer.concat([
    header(0x00080005, 0, null).subarray(0, 4),
    Buffer.from('CS\0\0', 'latin1'),
    text,
  ]);
  element.writeUInt16LE(text.length, 6);
  const at = bytes.indexOf(characterSetTag);
  const start = at >= 0 ? at : (findLandmarks(bytes).find((landmark) => landmark.at > 132)?.at ?? 0);
  const replaced = at >= 0 && at + 8 <= bytes.length ? 8 + bytes.readUInt16LE(at + 6) : 0;
  return Buffer.concat([bytes.subarray(0, start), element, bytes.subarray(start + replaced)]);
};

const escapes = [
  '\x1b$B',
  '\x1b(B',
  '\x1b(J',
  '\x1b$)C',
  '\x1b$(D',
  '\x1b)I',
  '\x1b$)A',
  '\x1b-F',
  '\x1b',
  '\x1b$',
];

/** A text that ought not to be there: letters of no declared set, escapes, controls, more than the length allows. */
function oddText(random: Random): Buffer {
  return Buffer.concat(
    Array.from({ length: random.skewed(random.chance(0.02) ? 60_000 : 40) }, () =>
      random.chance(0.3)
        ? Buffer.from(random.pick(escapes), 'latin1')
        : Buffer.from([random.chance(0.7) ? 0x80 + random.below(128) : random.below(128)]),
    ),
  );
}

const numbers = [
  '',
  '-',
  '.',
  '1e',
  'e5',
  '1e400',
  '-1e-400',
  'NaN',
  'Infinity',
  '0x10',
  '1,5',
  '1 2',
  '++1',
  '1\\2\\\\3',
];
const moments = [
  '20260230',
  '99999999',
  '20260304250000',
  '2026',
  '20260304120000.123456789',
  '20260304+9999',
  '\\',
];
const anyText = (random: Random) => {
  const choices = random.pick([numbers, moments]);
  return Buffer.from(
    random.pick([...choices, '1234567890'.repeat(30), '2.25..1', '1.'.repeat(80)]),
    'latin1',
  );
};

/** Puts another value in place of one, with its right length or over what follows. */
const editValue: Mutation = (bytes, random) => {
  const landmarks = findLandmarks(bytes).filter(({ valueRepresentation }) => valueRepresentation !== 'SQ');
  if (landmarks.length === 0) return bytes;
  const { lengthAt, lengthBytes } = random.pick(landmarks);
  const start = lengthAt + lengthBytes;
  if (start > bytes.length) return bytes;
  const value = random.chance(0.5) ? oddText(random) : anyText(random);
  const changed = Buffer.from(bytes);
  if (random.chance(0.3)) {
    value.copy(changed, start);
    return changed;
  }
  const length = changed.readUIntLE(lengthAt, lengthBytes);
  changed.writeUIntLE(
    Math.min(value.length, lengthBytes === 2 ? 0xffff : value.length),
    lengthAt,
    lengthBytes,
  );
  const end = Math.min(changed.length, start + Math.min(length, 100_000));
  return Buffer.concat([changed.subarray(0, start), value, changed.subarray(end)]);
};

const syntaxes = [
  '1.2.840.10008.1.2',
  '1.2.840.10008.1.2.1',
  '1.2.840.10008.1.2.2',
  '1.2.840.10008.1.2.1.99',
  '1.2.840.10008.1.2.4.50',
];

/** Declares another transfer syntax than the one the file is in, cut or padded to the room there is. */
const declareSyntax: Mutation = (bytes, random) => {
  const at = bytes.indexOf(Buffer.from([0x02, 0x00, 0x10, 0x00, 0x55, 0x49]));
  if (at < 0 || at + 8 > bytes.length) return bytes;
  const changed = Buffer.from(bytes);
  const length = changed.readUInt16LE(at + 6);
  changed.write(random.pick(syntaxes).padEnd(length, '\0').slice(0, length), at + 8, 'latin1');
  return changed;
};

export const valueMutations: Record<string, Mutation> = {
  declareCharacterSet,
  editValue,
  declareSyntax,
};
