import type { ReadAgainList, ReadAgainPreview, ReadingSummary } from '../../../shared/contract/read-again';
import {
  formatFluoroscopyTime,
  formatInteger,
  formatKermaAreaProduct,
  formatReferenceAirKerma,
} from '../../../shared/units';
import { outcomeWords } from './report-words';

/** "1 file", "12 files". */
const count = (number: number, one: string, many: string) =>
  `${formatInteger(number)} ${number === 1 ? one : many}`;

/** What there is to read again, as a sentence. */
export function describeCandidates({ counts, readerVersion }: ReadAgainList): string {
  const { stored, held, refused, withoutBytes } = counts;
  const parts = [
    stored > 0 && `${count(stored, 'stored report', 'stored reports')} read by an earlier version`,
    held > 0 && count(held, 'held file', 'held files'),
    refused > 0 && `${count(refused, 'refused file', 'refused files')} that an earlier version refused`,
  ].filter((part) => part !== false);
  const there =
    parts.length === 0
      ? `Nothing kept was read by an earlier version than ${readerVersion}, and nothing is held.`
      : `The reader is at version ${readerVersion}. It may read again: ${parts.join(', ')}.`;
  const left =
    withoutBytes === 0
      ? ''
      : ` ${count(withoutBytes, 'file', 'files')} without kept bytes cannot be read again.`;
  return there + left;
}

export const verdictWords: Record<ReadAgainPreview['verdict'], string> = {
  same: 'reads as before',
  changes: 'values change',
  'becomes-readable': 'becomes readable',
  'still-unread': 'gives no report still',
  fails: 'cannot be read now; stays as it is',
  'not-kept': 'no bytes kept',
};

/** "40 looked at: 3 values change, 37 reads as before" in words that fit a count. */
export function describePreviews(previews: readonly ReadAgainPreview[]): string {
  const of = (verdict: ReadAgainPreview['verdict']) =>
    previews.filter((preview) => preview.verdict === verdict).length;
  const parts = [
    [of('changes'), 'with other values'],
    [of('becomes-readable'), 'readable now'],
    [of('same'), 'as before'],
    [of('still-unread'), 'without a report still'],
    [of('fails'), 'not readable now, left as they are'],
    [of('not-kept'), 'without bytes'],
  ].flatMap(([number, words]) => (number === 0 ? [] : [`${formatInteger(number as number)} ${words}`]));
  const head = count(previews.length, 'file looked at', 'files looked at');
  return parts.length === 0 ? `${head}.` : `${head}: ${parts.join(', ')}.`;
}

/** Files whose row is changed by applying, beyond the version noted. */
export const isToChoose = ({ verdict }: ReadAgainPreview): boolean =>
  verdict === 'changes' || verdict === 'becomes-readable';

type Line = { name: string; before: string; after: string };

/** The figures of the two readings side by side; only those that differ. */
export function compareSummaries(before: ReadingSummary, after: ReadingSummary): Line[] {
  const kerma = ({ referenceAirKermaGy }: ReadingSummary) => {
    const { value, unit } = formatReferenceAirKerma(referenceAirKermaGy);
    return `${value} ${unit}`;
  };
  const lines: Line[] = [
    { name: 'outcome', before: outcomeWords[before.outcome], after: outcomeWords[after.outcome] },
    { name: 'events', before: formatInteger(before.eventCount), after: formatInteger(after.eventCount) },
    { name: 'K a,r as reported', before: kerma(before), after: kerma(after) },
    {
      name: 'P KA as reported, Gy·cm²',
      before: formatKermaAreaProduct(before.kermaAreaProductGyCm2),
      after: formatKermaAreaProduct(after.kermaAreaProductGyCm2),
    },
    {
      name: 'fluoroscopy time, min',
      before: formatFluoroscopyTime(before.fluoroscopyTimeS),
      after: formatFluoroscopyTime(after.fluoroscopyTimeS),
    },
  ];
  return lines.filter((line) => line.before !== line.after);
}

/** Units at the end of a field's name, longest first. */
const units: [RegExp, string][] = [
  [/GyCm2$/, ', Gy·cm²'],
  [/UGy$/, ', µGy'],
  [/Gy$/, ', Gy'],
  [/Cm2$/, ', cm²'],
  [/PerS$/, ', per s'],
  [/Mm$/, ', mm'],
  [/Deg$/, ', degrees'],
  [/Ma$/, ', mA'],
  [/Ms$/, ', ms'],
  [/S$/, ', s'],
];

/** "primaryAngleDeg" → "primary angle, degrees"; a path keeps its steps: "filters 1 material". */
export function nameField(field: string): string {
  const [unit, sign] = units.find(([ending]) => ending.test(field)) ?? [/$/, ''];
  const words = field
    .replace(unit, '')
    .replaceAll('.', ' ')
    .replace(/([a-z0-9])([A-Z])/g, '$1 $2')
    .toLowerCase();
  return words.replace(/\bkvp\b/g, 'kVp') + sign;
}
