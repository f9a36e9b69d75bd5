import {
  garmentKindNames,
  garmentKinds,
  garmentMaterials,
  garmentSchema,
  garmentStates,
  type Garment,
  type GarmentInput,
} from '../../../shared/contract/garment';
import { formatKvp, formatLeadEquivalentMm } from '../../../shared/units';

export const kindChoices = garmentKinds.map((value) => ({ value, label: garmentKindNames[value] }));

export const materialNames: Record<(typeof garmentMaterials)[number], string> = {
  lead: 'Lead',
  'lead-composite': 'Lead composite',
  'lead-free': 'Without lead',
};
export const materialChoices = garmentMaterials.map((value) => ({ value, label: materialNames[value] }));

export const stateNames: Record<(typeof garmentStates)[number], string> = {
  'in-service': 'In service',
  withdrawn: 'Withdrawn',
  discarded: 'Discarded',
  lost: 'Lost',
};
export const stateChoices = garmentStates.map((value) => ({ value, label: stateNames[value] }));

export const newGarment: GarmentInput = {
  code: '',
  kind: 'vest-and-skirt',
  material: 'lead',
  frontLeadMm: null,
  backLeadMm: null,
  leadKvp: null,
  isMeasured: false,
  ownerId: null,
  state: 'in-service',
  lastInspectedOn: null,
  nextDueOn: null,
  note: '',
};

export const toGarmentInput = ({
  id: _id,
  owner,
  isOverdue: _isOverdue,
  ...garment
}: Garment): GarmentInput => ({ ...garment, ownerId: owner?.id ?? null });

export function readCurrentGarment(current: unknown): GarmentInput | null {
  const parsed = garmentSchema.safeParse(current);
  return parsed.success ? toGarmentInput(parsed.data) : null;
}

export const describeGarment = (personName: (id: string | null) => string) => (garment: GarmentInput) => [
  { name: 'Code', value: garment.code },
  { name: 'Kind', value: garmentKindNames[garment.kind] },
  { name: 'Material', value: materialNames[garment.material] },
  { name: 'Front, mm Pb', value: formatLeadEquivalentMm(garment.frontLeadMm) },
  { name: 'Back, mm Pb', value: formatLeadEquivalentMm(garment.backLeadMm) },
  { name: 'Holds at, kV', value: formatKvp(garment.leadKvp) },
  { name: 'Measured', value: garment.isMeasured ? 'yes' : 'no' },
  { name: 'Owner', value: personName(garment.ownerId) },
  { name: 'State', value: stateNames[garment.state] },
  { name: 'Last inspected', value: garment.lastInspectedOn ?? 'not known' },
  { name: 'Next due', value: garment.nextDueOn ?? 'no date' },
  { name: 'Note', value: garment.note || 'none' },
];
