import { readTypedQuantity } from '../../../shared/read-typed-quantity';
import { listFigures, unlistedMachine, type EntryValues, type PlacedFigure } from './entry-values';

export type EntryIssue = {
  path: keyof EntryValues | `${PlacedFigure['path']}.${'text' | 'unit'}` | 'root.figures';
  message: string;
};

/** What stands against sending, told before the second pass; the server looks at all of it again. */
export function findEntryIssues(values: EntryValues, kind: 'new' | 'attached' | 'correction'): EntryIssue[] {
  const issues: EntryIssue[] = [];
  const expect = (isRight: boolean, path: EntryIssue['path'], message: string) => {
    if (!isRight) issues.push({ path, message });
  };
  if (kind === 'new') {
    expect(values.equipmentId !== '', 'equipmentId', 'Choose the machine.');
    expect(
      values.equipmentId !== unlistedMachine || values.roomId !== '',
      'roomId',
      'Choose the room, since the machine is not in the list.',
    );
  }
  expect(values.localStartedAt !== '', 'localStartedAt', 'Give the day and the time.');
  const figures = listFigures(values);
  for (const { path, ...figure } of figures) {
    const { fault } = readTypedQuantity(figure);
    if (fault) issues.push({ path: `${path}.${fault.part}`, message: fault.detail });
  }
  expect(figures.length > 0, 'root.figures', 'Type at least one of the figures.');
  if (kind === 'correction') expect(values.reason.trim().length >= 3, 'reason', 'Say why in a few words.');
  return issues;
}

/** "/quantities/2/text" of the server → the field of the form that it means. */
export function pointToField(pointer: string, figures: readonly PlacedFigure[]): string {
  const [, list, index, part] = pointer.split('/');
  const figure = list === 'quantities' ? figures[Number(index)] : undefined;
  if (figure) return `${figure.path}.${part === 'unit' ? 'unit' : 'text'}`;
  const names: Record<string, string> = {
    '/patient/id': 'patientId',
    '/patient/name': 'patientName',
    '/patient/accessionNumber': 'accessionNumber',
    '/photoId': 'photo',
    '/quantities': 'root.figures',
  };
  return names[pointer] ?? pointer.slice(1);
}
