import { expect, it } from 'vitest';
import type { RecordInput } from '../../../shared/contract/record';
import { findLacking } from './find-lacking';
import { newPresence } from './presence-values';

const empty: RecordInput = {
  procedureTypeId: null,
  primaryOperatorId: null,
  secondOperatorId: null,
  traineeId: null,
  accessSide: null,
  isFeetFirst: null,
  isProne: null,
  isEmergency: null,
  patientHeightM: null,
  patientWeightKg: null,
  presences: [],
  version: 1,
};

it('names what is missing and whom it concerns', () => {
  expect(findLacking(empty, [])).toEqual([
    'the procedure type',
    'the operator',
    'at least one person in the room',
  ]);
  const people = [{ id: 'ana', name: 'Ana', job: 'nurse' as const, isActive: true }];
  const rows = [
    { ...newPresence('scrub', null), personId: 'ana' },
    { ...newPresence('other', null), visitorName: 'A guest', garmentAnswer: 'none' as const },
  ];
  expect(
    findLacking({ ...empty, procedureTypeId: 't', primaryOperatorId: 'ana', presences: rows }, people),
  ).toEqual(['the garment of Ana', 'the place of A guest']);
});

it('is satisfied by answers, also by "not known"', () => {
  const row = { ...newPresence('scrub', null), personId: 'ana', garmentAnswer: 'unknown' as const };
  expect(
    findLacking({ ...empty, procedureTypeId: 't', primaryOperatorId: 'ana', presences: [row] }, []),
  ).toEqual([]);
});
