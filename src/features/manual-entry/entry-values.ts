import { z } from 'zod';
import {
  typedQuantityNames,
  type ManualEntry,
  type TypedQuantity,
  type TypedQuantityName,
} from '../../../shared/contract/manual-entry';

const figureSchema = z.object({ text: z.string(), unit: z.string() });
export type FigureField = z.infer<typeof figureSchema>;
const planeFiguresSchema = z.record(z.enum(typedQuantityNames), figureSchema);
export type PlaneFigures = z.infer<typeof planeFiguresSchema>;

/** Chosen where the machine is in no list: then the room is asked for. */
export const unlistedMachine = 'unlisted';

export const entryValuesSchema = z.object({
  /** Empty: not chosen yet. */
  equipmentId: z.string(),
  roomId: z.string(),
  localStartedAt: z.string(),
  procedureTypeId: z.string().nullable(),
  patientId: z.string(),
  patientName: z.string(),
  accessionNumber: z.string(),
  hasTwoPlanes: z.boolean(),
  /** The only plane or plane A; plane B. */
  figures: z.tuple([planeFiguresSchema, planeFiguresSchema]),
  photo: z.object({ id: z.string(), fileName: z.string() }).nullable(),
  comment: z.string(),
  /** Of a correction. */
  reason: z.string(),
});
export type EntryValues = z.infer<typeof entryValuesSchema>;

/** Frames are counted: there is nothing to choose. */
const emptyFigure = (quantity: TypedQuantityName): FigureField => ({
  text: '',
  unit: quantity === 'frame-count' ? '1' : '',
});

const emptyPlane = (): PlaneFigures =>
  Object.fromEntries(typedQuantityNames.map((name) => [name, emptyFigure(name)])) as PlaneFigures;

export const emptyEntry = (overrides: Partial<EntryValues> = {}): EntryValues => ({
  equipmentId: '',
  roomId: '',
  localStartedAt: '',
  procedureTypeId: null,
  patientId: '',
  patientName: '',
  accessionNumber: '',
  hasTwoPlanes: false,
  figures: [emptyPlane(), emptyPlane()],
  photo: null,
  comment: '',
  reason: '',
  ...overrides,
});

/** An entry as form values, to be corrected. */
export function toEntryValues(entry: ManualEntry): EntryValues {
  const values = emptyEntry({
    equipmentId: entry.equipmentId ?? unlistedMachine,
    localStartedAt: entry.localStartedAt.slice(0, 16),
    hasTwoPlanes: entry.quantities.some(({ plane }) => plane === 'A' || plane === 'B'),
    photo: entry.photoId === null ? null : { id: entry.photoId, fileName: 'the picture of before' },
    comment: entry.comment ?? '',
  });
  for (const { quantity, plane, text, unit } of entry.quantities)
    values.figures[plane === 'B' ? 1 : 0][quantity] = { text, unit };
  return values;
}

export type PlacedFigure = TypedQuantity & { path: `figures.${0 | 1}.${TypedQuantityName}` };

/** What was typed, field by field, with its place in the form; an empty field is no figure. */
export function listFigures({
  figures,
  hasTwoPlanes,
}: Pick<EntryValues, 'figures' | 'hasTwoPlanes'>): PlacedFigure[] {
  const shown = hasTwoPlanes ? ([0, 1] as const) : ([0] as const);
  return shown.flatMap((index) =>
    typedQuantityNames.flatMap((quantity): PlacedFigure[] => {
      const { text, unit } = figures[index][quantity];
      const plane = !hasTwoPlanes ? 'single' : index === 0 ? 'A' : 'B';
      return text.trim() === ''
        ? []
        : [{ quantity, plane, text: text.trim(), unit, path: `figures.${index}.${quantity}` }];
    }),
  );
}

export const toTyped = ({ path: _, ...figure }: PlacedFigure): TypedQuantity => figure;
