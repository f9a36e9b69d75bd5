import { expect, test } from 'vitest';
import { buildSignInPath, readNextPath } from './paths';

test('sign-in leads back to where the person wanted to go', () => {
  const path = buildSignInPath('/procedures?room=NR1&period=7d');
  const next = new URL(path, 'http://here.example').searchParams.get('next');
  expect(readNextPath(next)).toBe('/procedures?room=NR1&period=7d');
});

test('sign-in never leads to another host', () => {
  expect(
    ['https://elsewhere.example', '//elsewhere.example', '/\\elsewhere.example', null].map(readNextPath),
  ).toEqual(['/', '/', '/', '/']);
});
