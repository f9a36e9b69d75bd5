import type { Code } from '../../shared/contract/report-parts';
import { concepts, type CodeEntry, type ConceptName } from './concepts.table-data';

/** SNOMED-RT has been written under three designators (PS3.16 section 8). */
const schemeNames = new Map([
  ['SRT', 'SRT'],
  ['SNM3', 'SRT'],
  ['99SDM', 'SRT'],
  ['SCT', 'SCT'],
  ['NCIT', 'NCIt'],
  ['DCM', 'DCM'],
]);

/** Private coding schemes (PS3.16 8.2): designators that start with "99", and the older "L". SNOMED-RT's "99SDM" is none. */
export function isPrivateScheme(scheme: string): boolean {
  return (scheme.startsWith('99') && scheme !== '99SDM') || scheme === 'L';
}

/** Scheme and value as one key; a code is never matched by its value alone. */
export function codeKey(scheme: string, value: string): string {
  const trimmed = scheme.trim();
  return `${schemeNames.get(trimmed.toUpperCase()) ?? trimmed}|${value.trim()}`;
}

function keysOf([scheme, value, , srtValue]: CodeEntry): string[] {
  const own = codeKey(scheme, value);
  return srtValue === undefined ? [own] : [own, codeKey('SRT', srtValue)];
}

function indexOf<Name extends string>(table: Record<Name, CodeEntry>): Map<string, Name> {
  const entries = Object.entries(table) as [Name, CodeEntry][];
  return new Map(entries.flatMap(([name, entry]) => keysOf(entry).map((key) => [key, name] as const)));
}

const conceptIndex = indexOf<ConceptName>(concepts);

/** The concept that a scheme and a code value name; null for one that the reader does not know. */
export function conceptNameOf(scheme: string, value: string): ConceptName | null {
  return conceptIndex.get(codeKey(scheme, value)) ?? null;
}

/** A look-up from code to value; SNOMED-RT and SNOMED-CT are equal. */
export function createValueLookup<Name extends string>(
  table: Record<Name, CodeEntry>,
  furtherKeys: Record<string, Name> = {},
): (code: Code | null) => Name | null {
  const index = indexOf(table);
  for (const [key, name] of Object.entries<Name>(furtherKeys)) index.set(key, name);
  return (code) => (code === null ? null : (index.get(codeKey(code.scheme, code.value)) ?? null));
}
