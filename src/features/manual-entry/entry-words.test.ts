// @vitest-environment jsdom
import { beforeEach, expect, test } from 'vitest';
import { describeTyped } from './conversion-words';
import { keepEntryDraft, readEntryDraft, dropEntryDraft } from './entry-draft';
import { emptyEntry, listFigures } from './entry-values';
import { findDoubts } from './find-doubts';
import { findEntryIssues, pointToField } from './find-entry-issues';

const thin = '\u202f';
beforeEach(() => sessionStorage.clear());

test('what is typed stands beside what it is', () => {
  const describe = (text: string, unit: string) =>
    describeTyped({ quantity: 'kerma-area-product', text, unit });
  expect(describe('1250', 'uGy.m2')).toBe(`1250${thin}µGy·m² is 12.5${thin}Gy·cm²`);
  expect(describe('12.5', 'Gy.cm2')).toBe(`12.5${thin}Gy·cm², taken as typed`);
  expect(describe('0.00430', 'Gy.m2')).toBe(`0.00430${thin}Gy·m² is 43${thin}Gy·cm²`);
  expect(describe('1250', '')).toBeNull();
  expect(describe('1,250', 'uGy.m2')).toBeNull();
  expect(describeTyped({ quantity: 'fluoroscopy-time', text: '12:30', unit: 'min:s' })).toBe(
    `12:30${thin}min:s is 12.5${thin}min`,
  );
  expect(describeTyped({ quantity: 'reference-air-kerma', text: '1.4', unit: 'Gy' })).toBe(
    `1.4${thin}Gy is 1${thin}400${thin}mGy`,
  );
});

const figure = (
  quantity: 'kerma-area-product' | 'reference-air-kerma' | 'fluoroscopy-time',
  text: string,
  unit: string,
) => ({ quantity, plane: 'single', text, unit }) as const;

test('a field of 1 cm² or 12,500 cm² raises doubt about the unit, one of 125 cm² does not', () => {
  const doubts = (kap: string) =>
    findDoubts([figure('kerma-area-product', kap, 'Gy.cm2'), figure('reference-air-kerma', '100', 'mGy')])
      .length;
  expect([doubts('0.1'), doubts('12.5'), doubts('1250')]).toEqual([1, 0, 1]);
});

test('seconds taken for minutes show in the rate', () => {
  const doubts = (unit: string) =>
    findDoubts([figure('reference-air-kerma', '900', 'mGy'), figure('fluoroscopy-time', '60', unit)]).length;
  expect([doubts('min'), doubts('s')]).toEqual([0, 1]);
});

test('an empty entry says everything it lacks; the server’s words find their fields', () => {
  expect(findEntryIssues(emptyEntry(), 'new').map(({ path }) => path)).toEqual([
    'equipmentId',
    'localStartedAt',
    'root.figures',
  ]);
  const values = emptyEntry({ hasTwoPlanes: true });
  values.figures[1]['kerma-area-product'] = { text: '3', unit: 'Gy.cm2' };
  const figures = listFigures(values);
  expect(figures).toMatchObject([{ plane: 'B', quantity: 'kerma-area-product' }]);
  expect(pointToField('/quantities/0/unit', figures)).toBe('figures.1.kerma-area-product.unit');
  expect(pointToField('/localStartedAt', figures)).toBe('localStartedAt');
});

test('figures of a plane that is out of sight are not sent', () => {
  const values = emptyEntry();
  values.figures[1]['kerma-area-product'] = { text: '3', unit: 'Gy.cm2' };
  expect(listFigures(values)).toEqual([]);
});

test('a draft comes back with its key until it is dropped, and nothing else is taken for one', () => {
  const draft = {
    key: '0f8fad5b-d9cb-469f-a165-70867728950e',
    values: emptyEntry({ comment: 'half typed' }),
  };
  keepEntryDraft('new', draft);
  expect(readEntryDraft('new')).toEqual(draft);
  expect(readEntryDraft('other')).toBeNull();
  dropEntryDraft('new');
  expect(readEntryDraft('new')).toBeNull();
  sessionStorage.setItem('leeward-entry-draft-new', '{"key":"x"}');
  expect(readEntryDraft('new')).toBeNull();
});
