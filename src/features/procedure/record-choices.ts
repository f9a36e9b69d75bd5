import type { Garment } from '../../../shared/contract/garment';
import { jobNames, type PersonChoice } from '../../../shared/contract/person';
import type { ProcedureType } from '../../../shared/contract/procedure-type';
import type { ComboboxChoice } from '../../ui/use-combobox';

/** What the record form offers; a page reads it from the registers. */
export type RecordChoices = {
  people: readonly PersonChoice[];
  types: readonly ProcedureType[];
  garments: readonly Garment[];
};

/** People who still work here, and those this record names already. */
export const offerPeople = (
  people: readonly PersonChoice[],
  named: readonly (string | null)[],
): ComboboxChoice[] =>
  people
    .filter((person) => person.isActive || named.includes(person.id))
    .map((person) => ({ value: person.id, label: person.name, detail: jobNames[person.job] }));

export const offerTypes = (types: readonly ProcedureType[], chosen: string | null): ComboboxChoice[] =>
  types
    .filter((type) => type.isActive || type.id === chosen)
    .map((type) => ({ value: type.id, label: type.name, detail: type.key }));
