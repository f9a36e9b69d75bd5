import {
  equipmentSchema,
  tubePositions,
  type Equipment,
  type EquipmentInput,
  type NewEquipment,
} from '../../../shared/contract/equipment';

export const tubePositionNames: Record<(typeof tubePositions)[number], string> = {
  'under-table': 'Under the table',
  'over-table': 'Over the table',
};
export const tubePositionChoices = tubePositions.map((value) => ({ value, label: tubePositionNames[value] }));

export const newMachine: NewEquipment = {
  label: '',
  roomId: null,
  tubePosition: 'under-table',
  inServiceFrom: null,
  inServiceTo: null,
  manufacturer: '',
  modelName: '',
  serialNumber: '',
  stationName: null,
};

export const toEquipmentInput = (machine: Equipment): EquipmentInput => ({
  label: machine.label,
  roomId: machine.roomId,
  tubePosition: machine.tubePosition,
  inServiceFrom: machine.inServiceFrom,
  inServiceTo: machine.inServiceTo,
  version: machine.version,
});

export function readCurrentEquipment(current: unknown): EquipmentInput | null {
  const parsed = equipmentSchema.safeParse(current);
  return parsed.success ? toEquipmentInput(parsed.data) : null;
}

/** "2025-03-01 to 2026-09-30"; an open end is left out. */
export function describeService({
  inServiceFrom,
  inServiceTo,
}: Pick<EquipmentInput, 'inServiceFrom' | 'inServiceTo'>): string {
  if (!inServiceFrom && !inServiceTo) return '';
  if (!inServiceTo) return `from ${inServiceFrom}`;
  return inServiceFrom ? `${inServiceFrom} to ${inServiceTo}` : `to ${inServiceTo}`;
}

export const describeMachine =
  (roomName: (id: string | null) => string) => (machine: Omit<EquipmentInput, 'version'>) => [
    { name: 'Label', value: machine.label },
    { name: 'Room', value: roomName(machine.roomId) },
    { name: 'Tube', value: tubePositionNames[machine.tubePosition] },
    { name: 'In service', value: describeService(machine) || 'no dates' },
  ];
