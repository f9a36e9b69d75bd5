import { expect, test } from 'vitest';
import { readArea, writeArea } from './chosen-area';

test('a chosen rectangle comes back from the address, to three digits', () => {
  const area = { xFrom: 0.2034, xTo: 20, yFrom: 80.123, yTo: 95 };
  expect(writeArea(area)).toBe('0.203-20_80.1-95');
  expect(readArea(writeArea(area))).toEqual({ xFrom: 0.203, xTo: 20, yFrom: 80.1, yTo: 95 });
});

test.each([null, '', '5-20', '20-5_80-95', 'a-b_c-d', '0-5_80-95', '5-20_80-95_1'])(
  'nonsense names no rectangle: %j',
  (text) => expect(readArea(text)).toBeNull(),
);
