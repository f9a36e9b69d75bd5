import type { PersonChoice } from '../../../shared/contract/person';
import type { RecordInput } from '../../../shared/contract/record';

/** What keeps a record from being complete, with the people it concerns; empty when nothing does. */
export function findLacking(values: RecordInput, people: readonly PersonChoice[]): string[] {
  const name = ({ personId, visitorName }: RecordInput['presences'][number], place: number): string =>
    visitorName || people.find((one) => one.id === personId)?.name || `row ${place + 1}`;
  const lacking: string[] = [];
  if (values.procedureTypeId === null) lacking.push('the procedure type');
  if (values.primaryOperatorId === null) lacking.push('the operator');
  if (values.presences.length === 0) lacking.push('at least one person in the room');
  values.presences.forEach((presence, place) => {
    if (presence.personId === null && !presence.visitorName) lacking.push(`who stands in row ${place + 1}`);
    if (presence.fluoroscopyPlace === null) lacking.push(`the place of ${name(presence, place)}`);
    if (presence.garmentAnswer === 'unanswered') lacking.push(`the garment of ${name(presence, place)}`);
  });
  return lacking;
}
