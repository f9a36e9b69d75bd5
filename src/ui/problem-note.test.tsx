// @vitest-environment jsdom
import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, beforeEach, expect, test } from 'vitest';
import { ApiProblem } from '../lib/api-problem';
import { namePointer, ProblemNote } from './problem-note';

beforeEach(() => {
  // Newer browsers return a promise here; React must not take it for a cleanup.
  Element.prototype.scrollIntoView = (() => Promise.resolve()) as () => void;
});
afterEach(cleanup);

const buildProblem = () =>
  new ApiProblem({
    type: 'about:blank',
    title: 'Some of the input cannot be taken',
    status: 422,
    code: 'invalid-input',
    detail: 'Nothing was changed.',
    requestId: 'r-7',
    issues: [
      { pointer: '/presences/1/garmentId', detail: 'Choose the garment.' },
      { pointer: '/code', detail: 'Fill this in.' },
    ],
  });

test('every issue is told, named as the page names it', () => {
  const { rerender } = render(<ProblemNote error={buildProblem()} fieldNames={{ '/code': 'Room code' }} />);
  rerender(<ProblemNote error={buildProblem()} fieldNames={{ '/code': 'Room code' }} />);
  expect(screen.getAllByRole('listitem').map((item) => item.textContent)).toEqual([
    'presences, 2, garment id: Choose the garment.',
    'Room code: Fill this in.',
  ]);
  expect(screen.getByRole('alert').textContent).toContain('Request r-7');
});

test('no error, no note', () => {
  render(<ProblemNote error={null} />);
  expect(screen.queryByRole('alert')).toBeNull();
});

test('a pointer without a name is read as words', () => {
  expect([namePointer('/filters/0/minThicknessMm'), namePointer('')]).toEqual([
    'filters, 1, min thickness mm',
    'The whole',
  ]);
});
