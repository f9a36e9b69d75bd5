import { expect, test } from 'vitest';
import { findChoices } from './use-combobox';

const people = [
  { value: '1', label: 'Operator IC-2', detail: 'Interventional cardiologist' },
  { value: '2', label: 'Nurse N-03', detail: 'Nurse' },
  { value: '3', label: 'Zoë Nurmi', detail: 'Technologist' },
];
const findValues = (typed: string) => findChoices(people, typed).map((choice) => choice.value);

test('nothing typed shows everybody', () => {
  expect(findValues('')).toEqual(['1', '2', '3']);
});
test('words may come in any order and may be found in the second line', () => {
  expect(findValues('cardio ic')).toEqual(['1']);
});
test('accents need not be typed', () => {
  expect(findValues('zoe')).toEqual(['3']);
});
test('names that start with the text come first', () => {
  expect(findChoices([people[2]!, people[1]!], 'nur').map((choice) => choice.value)).toEqual(['2', '3']);
});
