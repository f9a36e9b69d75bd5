import { expect, it } from 'vitest';
import { nameReported } from './reported-names';

it('names a reported value without our own unit, which may not be the file’s', () => {
  expect(nameReported('fieldAreaCm2')).toBe('Collimated field area');
  expect(nameReported('tableHeightMm')).toBe('Table height');
  expect(nameReported('exposureTimeS')).toBe('Exposure time');
  expect(nameReported('primaryAngleDeg')).toBe('Primary angle');
});
