import { expect, test } from 'vitest';
import { z } from 'zod';
import { readFilter, writeFilter } from './url-filter';

const schema = z.object({
  room: z.string().optional(),
  period: z.enum(['7d', '90d']).default('90d'),
  limit: z.coerce.number().int().max(200).default(50),
});

test('a filter is read with its defaults', () => {
  expect(readFilter(schema, new URLSearchParams('room=NR1'))).toEqual({
    room: 'NR1',
    period: '90d',
    limit: 50,
  });
});

test('a refused part falls back without spoiling the others', () => {
  const query = new URLSearchParams('period=never&room=NR1&limit=9999');
  expect(readFilter(schema, query)).toEqual({ room: 'NR1', period: '90d', limit: 50 });
});

test('defaults and empty parts leave the address, foreign parts stay', () => {
  const query = new URLSearchParams('tab=events&room=NR1&period=7d');
  expect(writeFilter(schema, query, { room: '', period: '90d' }).toString()).toBe('tab=events');
  expect(writeFilter(schema, query, { room: 'CL1' }).toString()).toBe('tab=events&room=CL1&period=7d');
});
