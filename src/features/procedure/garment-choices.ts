import { garmentKindNames, type Garment, type GarmentKind } from '../../../shared/contract/garment';
import type { Presence } from '../../../shared/contract/record';
import { formatLeadEquivalentMm } from '../../../shared/units';
import type { ComboboxChoice } from '../../ui/use-combobox';

const bodyKinds: readonly GarmentKind[] = ['vest-and-skirt', 'one-piece'];

/** In-service things of one person, those in date before those overdue. */
export const findOwn = (
  garments: readonly Garment[],
  personId: string | null,
  kinds: readonly GarmentKind[] = bodyKinds,
): Garment[] =>
  garments
    .filter((one) => personId !== null && one.owner?.id === personId)
    .filter((one) => one.state === 'in-service' && kinds.includes(one.kind))
    .sort((one, other) => Number(one.isOverdue) - Number(other.isOverdue));

/** "LG-014, 0.50 / 0.25 mm Pb". */
export function nameGarment(garment: Garment): string {
  const lead = [garment.frontLeadMm, garment.backLeadMm]
    .filter((mm) => mm !== null)
    .map(formatLeadEquivalentMm);
  return lead.length === 0 ? garment.code : `${garment.code}, ${lead.join(' / ')} mm Pb`;
}

const describeGarment = (garment: Garment, whose: string): string =>
  [
    whose,
    garmentKindNames[garment.kind].toLowerCase(),
    garment.state === 'in-service' ? null : garment.state,
    garment.isOverdue ? 'inspection overdue' : null,
  ]
    .filter(Boolean)
    .join(', ');

const toChoice = (garment: Garment, whose: string): ComboboxChoice => ({
  value: garment.id,
  label: nameGarment(garment),
  detail: describeGarment(garment, whose),
});

const answers: ComboboxChoice[] = [
  { value: 'none', label: 'None worn' },
  { value: 'unknown', label: 'Not known', detail: 'nothing is estimated behind it' },
];

/**
 * What a person may have worn: own garments, the two other answers, shared ones, then other people's.
 * Withdrawn and lost ones are offered to nobody; one that an old record names stays readable.
 */
export function offerGarments(
  garments: readonly Garment[],
  personId: string | null,
  chosenId: string | null,
): ComboboxChoice[] {
  const body = garments.filter((one) => bodyKinds.includes(one.kind));
  const inService = body.filter((one) => one.state === 'in-service');
  const own = findOwn(garments, personId);
  const chosen = body.find((one) => one.id === chosenId && one.state !== 'in-service');
  const shared = inService.filter((one) => one.owner === null);
  const foreign = inService.filter((one) => one.owner !== null && one.owner.id !== personId);
  return [
    ...own.map((one) => toChoice(one, 'own')),
    ...answers,
    ...(chosen ? [toChoice(chosen, 'as recorded')] : []),
    ...shared.map((one) => toChoice(one, 'shared')),
    ...foreign.map((one) => toChoice(one, `of ${one.owner?.name}`)),
  ];
}

type Answer = Pick<Presence, 'garmentAnswer' | 'garmentId'>;

export const readGarmentChoice = (value: string | null): Answer => {
  if (value === null) return { garmentAnswer: 'unanswered', garmentId: null };
  if (value === 'none' || value === 'unknown') return { garmentAnswer: value, garmentId: null };
  return { garmentAnswer: 'worn', garmentId: value };
};

export const writeGarmentChoice = ({ garmentAnswer, garmentId }: Answer): string | null =>
  garmentAnswer === 'worn' ? garmentId : garmentAnswer === 'unanswered' ? null : garmentAnswer;
