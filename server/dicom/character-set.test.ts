import { describe, expect, it } from 'vitest';
import { createTextReader } from './character-set';

function read(declared: string | null, hex: string) {
  const notices: string[] = [];
  const text = createTextReader(declared, (code) => notices.push(code)).decode(
    Uint8Array.from(Buffer.from(hex.replaceAll(' ', ''), 'hex')),
  );
  return { text, notices };
}

// Source: the worked person names of DICOM PS3.5 annexes H (Japanese), I (Korean) and J (Chinese), bytes from memory.
describe("the standard's examples", () => {
  it('Japanese: ISO 2022 IR 87 behind an empty first value', () => {
    const hex =
      '59616D6164615E5461726F753D 1B2442 3B33 4544 1B2842 5E 1B2442 4240 4F3A 1B2842 3D' +
      '1B2442 2464 245E 2440 1B2842 5E 1B2442 243F 246D 2426 1B2842';
    expect(read('\\ISO 2022 IR 87', hex)).toEqual({
      text: 'Yamada^Tarou=山田^太郎=やまだ^たろう',
      notices: [],
    });
  });

  it('Japanese: half-width katakana of ISO_IR 13 before the escapes', () => {
    const hex = 'D4CFC0DE5EC0DBB33D 1B2442 3B33 4544 1B284A 5E 1B2442 4240 4F3A 1B284A';
    expect(read('ISO 2022 IR 13\\ISO 2022 IR 87', hex).text).toBe('ﾔﾏﾀﾞ^ﾀﾛｳ=山田^太郎');
  });

  it('Korean: ISO 2022 IR 149 in the upper half', () => {
    const hex =
      '486F6E675E47696C646F6E673D 1B242943 FBF3 5E 1B242943 D1CE D4D7 3D 1B242943 C8AB 5E 1B242943 B1E6 B5BF';
    expect(read('\\ISO 2022 IR 149', hex).text).toBe('Hong^Gildong=洪^吉洞=홍^길동');
  });

  it('Chinese: UTF-8 and GB18030', () => {
    expect(read('ISO_IR 192', '57616E675E5869616F446F6E673D E78E8B 5E E5B08F E69DB1 3D').text).toBe(
      'Wang^XiaoDong=王^小東=',
    );
    expect(read('GB18030', '57616E675E5869616F446F6E673D CDF5 5E D0A1 B6AB 3D').text).toBe(
      'Wang^XiaoDong=王^小东=',
    );
  });
});

describe('character sets', () => {
  it('read one-byte sets', () => {
    expect(read('ISO_IR 100', '52 69 76 69 E8 72 65').text).toBe('Rivière');
    expect(read('ISO_IR 144', 'BB EE DA 63 65 DC D1 E3 E0 D3').text).toBe('Люкceмбург');
    expect(read('ISO 2022 IR 6\\ISO 2022 IR 100', '1B2D41 E9').text).toBe('é');
  });

  it('keep a GB18030 character whose second byte looks like a delimiter', () => {
    expect(read('GB18030', 'D5 5C 5E 41')).toEqual({ text: '誠^A', notices: [] });
  });

  it('read undeclared bytes as UTF-8 where they are that, else as Windows-1252, with a warning', () => {
    expect(read(null, '5A 6F C3 AB')).toEqual({ text: 'Zoë', notices: ['character-set-undeclared'] });
    expect(read(null, '5A 6F EB')).toEqual({ text: 'Zoë', notices: ['character-set-undeclared'] });
    expect(read(null, '5A 6F 65')).toEqual({ text: 'Zoe', notices: [] });
  });

  it('read wrongly declared bytes and say so', () => {
    expect(read('ISO_IR 192', '5A 6F EB')).toEqual({ text: 'Zoë', notices: ['character-set-wrong'] });
    expect(read('ISO_IR 100', '5A 6F C3 AB')).toEqual({ text: 'Zoë', notices: ['character-set-wrong'] });
    expect(read('LATIN-1', '5A 6F EB')).toEqual({ text: 'Zoë', notices: ['character-set-unknown'] });
  });

  it('take a one-byte set for UTF-8 only where that gives letters of the set', () => {
    expect(read('ISO_IR 144', 'C2 B0')).toEqual({ text: 'ТА', notices: [] });
    expect(read('ISO_IR 101', 'E8 BE A3')).toEqual({ text: 'čžŁ', notices: [] });
    expect(read('ISO_IR 144', 'D0 9F D0 B5')).toEqual({ text: 'Пе', notices: ['character-set-wrong'] });
  });

  it('drop padding and NUL, keep markup as it is', () => {
    expect(read(null, '3C 62 3E 00 41 20 20 00').text).toBe('<b>A');
  });
});
