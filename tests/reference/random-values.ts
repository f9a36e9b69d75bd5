import fc from 'fast-check';
import type { CodeTriple, ContentNode } from './content-node';
import { conversions } from './reader-comparison';

export const dcm = (value: string): CodeTriple => [value, 'DCM', `concept ${value}`];
/** Concepts of SNOMED among those below, by their current and their older code. */
export const conceptOf = (value: string): CodeTriple =>
  /^[A-Z]/.test(value) ? [value, 'SRT', value] : /^\d{8,}$/.test(value) ? [value, 'SCT', value] : dcm(value);

/** Terms of Specific Character Set → letters that the set has beyond ASCII. */
export const alphabets: Record<string, string> = {
  '': '',
  'ISO_IR 100': 'äéñØß',
  'ISO_IR 101': 'čřőćđ',
  'ISO_IR 144': 'юшдяж',
  'ISO_IR 192': 'äЖ星ﾎ€😀',
  GB18030: '星河烏誠é',
  'ISO 2022 IR 87': '星川月つき',
  'ISO 2022 IR 149': '하늘별빛달',
};

const ascii = 'ABCdefxyz0189 .,:;<>&"\'()/_+-';
export const uid = fc
  .array(fc.integer({ min: 1, max: 99_999 }), { minLength: 1, maxLength: 6 })
  .map((parts) => `2.25.${parts.join('.')}`);

const decimal = fc
  .record({
    sign: fc.constantFrom('', '-', '+'),
    whole: fc.integer({ min: 0, max: 99_999 }),
    fraction: fc.option(fc.integer({ min: 0, max: 9_999 })),
    exponent: fc.option(fc.integer({ min: -9, max: 5 })),
    letter: fc.constantFrom('e', 'E'),
  })
  .map(({ sign, whole, fraction, exponent, letter }) => {
    const point = fraction === null ? '' : `.${String(fraction).padStart(4, '0')}`;
    return `${sign}${whole}${point}${exponent === null ? '' : letter + exponent}`;
  });

/** The units that measure what the field's name ends in. */
function unitsOf(field: string): string[] {
  const endings = Object.values(conversions).flatMap((pairs) => pairs.map(([ending]) => ending));
  const longest = endings
    .filter((ending) => field.endsWith(ending))
    .reduce((best, ending) => (ending.length > best.length ? ending : best), '');
  return Object.entries(conversions)
    .filter(([, pairs]) => pairs.some(([ending]) => ending === longest))
    .map(([unit]) => unit);
}

const qualifiers: CodeTriple[] = [dcm('114000'), dcm('114006'), dcm('114001')];

export const numberOf = (concept: string, field: string): fc.Arbitrary<ContentNode> =>
  fc
    .tuple(decimal, fc.constantFrom(...unitsOf(field)), fc.integer({ min: 0, max: 19 }))
    .map(([text, unit, chance]) => ({
      r: 'CONTAINS' as const,
      t: 'NUM' as const,
      c: dcm(concept),
      v:
        chance === 0
          ? { q: qualifiers[unit.length % 3] as CodeTriple }
          : ([text, unit, 'UCUM'] satisfies CodeTriple),
    }));

/** Some of the number items of a container; those of lists several times. */
export function numbersFor(fields: Record<string, string>): fc.Arbitrary<ContentNode[]> {
  const each = Object.entries(fields)
    .filter(([, field]) => !field.includes('.'))
    .map(([concept, field]) =>
      fc
        .integer({ min: 0, max: 2 })
        .chain((chance) =>
          chance > 0
            ? fc.constant<ContentNode[]>([])
            : fc.array(numberOf(concept, field), { minLength: 1, maxLength: /Values/.test(field) ? 4 : 1 }),
        ),
    );
  return fc.tuple(...each).map((lists) => lists.flat());
}

/** Builders of values in one character set. */
export function valuesIn(characterSet: string) {
  const letters = [...ascii, ...(alphabets[characterSet] ?? '').repeat(4)].join('');
  const text = fc
    .array(fc.constantFrom(...[...letters]), { minLength: 1, maxLength: 24 })
    .map((parts) => parts.join('').trim())
    .filter((one) => one !== '');
  const name = fc.array(text, { minLength: 1, maxLength: 3 }).map((parts) => parts.join('^'));
  const codeValue = fc.oneof(
    fc.stringMatching(/^[A-Z][A-Z0-9-]{0,14}$/),
    fc.stringMatching(/^[0-9]{5,9}$/),
    fc.stringMatching(/^[0-9]{17,30}$/),
  );
  const code = fc.oneof(
    {
      weight: 9,
      arbitrary: fc.tuple(codeValue, fc.constantFrom('SCT', 'SRT', 'DCM', '99QUILLON', 'LN'), text),
    },
    uid.map((one): CodeTriple => [`urn:oid:${one}`, '', 'by URN']),
  ) as fc.Arbitrary<CodeTriple>;
  return { text, name, code };
}

export type Values = ReturnType<typeof valuesIn>;
