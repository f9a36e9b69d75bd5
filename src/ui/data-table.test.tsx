// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { MemoryRouter, Route, Routes } from 'react-router-dom';
import { afterEach, expect, test, vi } from 'vitest';
import { DataTable } from './data-table';
import type { Column, Sort } from './data-table.types';

type Room = { id: string; name: string; cases: number };
const rooms: Room[] = [
  { id: 'a', name: 'NR1', cases: 12 },
  { id: 'b', name: 'IR2', cases: 40 },
  { id: 'c', name: 'CL1', cases: 7 },
];
const columns: Column<Room>[] = [
  { key: 'name', head: 'Room', phone: 'title', sortKey: 'name', cell: (room) => room.name },
  { key: 'cases', head: 'Cases', align: 'end', sortKey: 'cases', cell: (room) => room.cases },
];

function show(onSort: (sort: Sort) => void = () => {}, sort?: Sort) {
  render(
    <MemoryRouter>
      <Routes>
        <Route
          path="/"
          element={
            <DataTable
              caption="Rooms"
              columns={columns}
              rows={rooms}
              rowKey={(room) => room.id}
              rowHref={(room) => `/rooms/${room.id}`}
              sort={sort}
              onSort={onSort}
            />
          }
        />
        <Route path="/rooms/:id" element={<p>opened</p>} />
      </Routes>
    </MemoryRouter>,
  );
}
afterEach(cleanup);

test('figures sort from the highest first, names from A, and a second press turns the order', () => {
  const onSort = vi.fn();
  show(onSort, { key: 'name', order: 'ascending' });
  fireEvent.click(screen.getByRole('button', { name: 'Cases' }));
  fireEvent.click(screen.getByRole('button', { name: 'Room' }));
  expect(onSort.mock.calls.map(([sort]) => sort)).toEqual([
    { key: 'cases', order: 'descending' },
    { key: 'name', order: 'descending' },
  ]);
  expect(screen.getByRole('columnheader', { name: 'Room' }).getAttribute('aria-sort')).toBe('ascending');
});

test('arrow keys, Home and End walk the rows and stop at the ends', () => {
  show();
  const links = screen.getAllByRole('link');
  links[0]?.focus();
  const press = (key: string) => {
    fireEvent.keyDown(document.activeElement ?? document.body, { key });
    return document.activeElement?.textContent;
  };
  expect(['ArrowDown', 'End', 'ArrowDown', 'Home', 'ArrowUp'].map(press)).toEqual([
    'IR2',
    'CL1',
    'CL1',
    'NR1',
    'NR1',
  ]);
});

test('a press anywhere on a row opens it', () => {
  show();
  fireEvent.click(screen.getByRole('cell', { name: /40/ }));
  expect(screen.getByText('opened')).toBeTruthy();
});

test('the row is named by its head for screen readers', () => {
  show();
  expect(screen.getAllByRole('rowheader').map((cell) => cell.textContent)).toEqual(['NR1', 'IR2', 'CL1']);
});
