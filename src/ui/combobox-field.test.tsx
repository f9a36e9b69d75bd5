// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { useState } from 'react';
import { afterEach, beforeEach, expect, test } from 'vitest';
import { ComboboxField } from './combobox-field';

const people = ['IC-1', 'IC-2', 'EP-1'].map((label) => ({ value: label.toLowerCase(), label }));

function Field() {
  const [value, setValue] = useState<string | null>('ep-1');
  return (
    <>
      <ComboboxField label="Operator" choices={people} value={value} onChange={setValue} />
      <output>{value ?? 'nobody'}</output>
    </>
  );
}
const read = () => screen.getByRole('status').textContent;
const find = () => screen.getByRole<HTMLInputElement>('combobox', { name: 'Operator' });
const press = (key: string) => fireEvent.keyDown(find(), { key });

// jsdom lays nothing out and so cannot scroll.
beforeEach(() => {
  Element.prototype.scrollIntoView = () => {};
});
afterEach(cleanup);

test('a few letters, an arrow and Enter choose a person', () => {
  render(<Field />);
  fireEvent.change(find(), { target: { value: 'ic' } });
  expect(screen.getAllByRole('option').map((option) => option.textContent)).toEqual(['IC-1', 'IC-2']);
  press('ArrowDown');
  press('Enter');
  expect(read()).toBe('ic-2');
  expect(find().value).toBe('IC-2');
});

test('Escape and leaving the field change nothing', () => {
  render(<Field />);
  fireEvent.change(find(), { target: { value: 'ic' } });
  press('Escape');
  expect([find().value, read()]).toEqual(['EP-1', 'ep-1']);
  fireEvent.change(find(), { target: { value: 'zzz' } });
  fireEvent.blur(find());
  expect([find().value, read()]).toEqual(['EP-1', 'ep-1']);
});

test('an emptied field means nobody', () => {
  render(<Field />);
  fireEvent.change(find(), { target: { value: '' } });
  expect(read()).toBe('nobody');
});

test('the list opens on the chosen person', () => {
  render(<Field />);
  press('ArrowDown');
  expect(screen.getByRole('option', { selected: true }).textContent).toBe('EP-1');
});
