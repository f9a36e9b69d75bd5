// @vitest-environment jsdom
import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, expect, test } from 'vitest';
import { formatReferenceAirKermaMgy } from '../../shared/units';
import { Caution } from './caution';
import { Quantity } from './quantity';

afterEach(cleanup);
const read = () => document.body.textContent;

test('a missing value is a dash with words, and carries neither unit nor sign', () => {
  render(<Quantity value={formatReferenceAirKermaMgy(null)} unit="mGy" isUpperBound isCorrected />);
  expect(read()).toBe('–not reported');
});

test('an upper bound and a corrected value say so to those who do not see the signs', () => {
  render(<Quantity value={formatReferenceAirKermaMgy(1.51)} unit="mGy" isUpperBound isCorrected />);
  expect(screen.getByRole('img', { name: 'at most' })).toBeTruthy();
  expect(read()).toContain('corrected');
});

test('a caution prints the quantity signs with their subscripts', () => {
  render(<Caution of="displayed-tolerance" values={{ ofDate: ' of 2026-03-01' }} />);
  expect([...document.querySelectorAll('sub')].map((sub) => sub.textContent)).toEqual(['a,r', 'KA']);
  expect(read()).toMatch(/factor of 2026-03-01\.$/);
});
