import { z } from 'zod';
import {
  bodyRegions,
  procedureTypeInputSchema,
  procedureTypeSchema,
  type ProcedureType,
} from '../../../shared/contract/procedure-type';
import { formatKvp } from '../../../shared/units';

/** The words that recognise a type stand one in a line, where they are edited. */
export const procedureTypeFormSchema = procedureTypeInputSchema.extend({
  recognisedBy: z
    .string()
    .transform((text) => text.split('\n').map((line) => line.trim()))
    .transform((lines) => lines.filter(Boolean))
    .pipe(procedureTypeInputSchema.shape.recognisedBy),
});
export type ProcedureTypeValues = z.input<typeof procedureTypeFormSchema>;

export const regionNames: Record<(typeof bodyRegions)[number], string> = {
  head: 'Head and neck',
  chest: 'Chest',
  abdomen: 'Abdomen',
  pelvis: 'Pelvis',
  extremity: 'Extremity',
  other: 'Other',
};
export const regionChoices = bodyRegions.map((value) => ({ value, label: regionNames[value] }));

export const newProcedureType: ProcedureTypeValues = {
  key: '',
  name: '',
  bodyRegion: 'chest',
  typicalKvp: null,
  recognisedBy: '',
  isActive: true,
};

export const toProcedureTypeValues = ({ id: _id, recognisedBy, ...type }: ProcedureType) => ({
  ...type,
  recognisedBy: recognisedBy.join('\n'),
});

export function readCurrentType(current: unknown): ProcedureTypeValues | null {
  const parsed = procedureTypeSchema.safeParse(current);
  return parsed.success ? toProcedureTypeValues(parsed.data) : null;
}

export const describeType = (type: ProcedureTypeValues) => [
  { name: 'Code', value: type.key },
  { name: 'Name', value: type.name },
  { name: 'Body region', value: regionNames[type.bodyRegion] },
  { name: 'Typical tube voltage, kV', value: formatKvp(type.typicalKvp) },
  { name: 'Recognised by', value: type.recognisedBy.split('\n').filter(Boolean).join(', ') || 'nothing' },
  { name: 'In use', value: type.isActive ? 'yes' : 'no' },
];
