import { randomUUID } from 'node:crypto';
import type { TypedQuantity } from '../shared/contract/manual-entry';

export const kap = (
  text: string,
  unit = 'Gy.cm2',
  plane: TypedQuantity['plane'] = 'single',
): TypedQuantity => ({
  quantity: 'kerma-area-product',
  plane,
  text,
  unit,
});
export const kerma = (
  text: string,
  unit = 'Gy',
  plane: TypedQuantity['plane'] = 'single',
): TypedQuantity => ({
  ...kap(text, unit, plane),
  quantity: 'reference-air-kerma',
});

export const typedEntry = (quantities: TypedQuantity[], overrides: object = {}) => ({
  key: randomUUID(),
  procedureId: null,
  equipmentId: null,
  roomId: null,
  procedureTypeId: null,
  localStartedAt: '2026-11-30T09:15',
  patient: { id: null, name: null, accessionNumber: null },
  quantities,
  photoId: null,
  comment: null,
  ...overrides,
});

/** Where an answer points to. */
export const pointers = (body: { issues: { pointer: string }[] }) =>
  body.issues.map(({ pointer }) => pointer);
