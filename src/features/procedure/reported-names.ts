const names: Record<string, string> = {
  kvpValues: 'kVp',
  tubeCurrentValuesMa: 'X-ray tube current',
  pulseWidthValuesMs: 'Pulse width',
  pulseCount: 'Pulses',
  pulseRatePerS: 'Pulse rate',
  kermaAreaProductGyCm2: 'Air kerma–area product',
  referenceAirKermaGy: 'Reference air kerma',
  fieldAreaCm2: 'Collimated field area',
  sourceToIsocenterMm: 'Source to isocentre',
  'filters.minThicknessMm': 'Filter thickness, least',
  'filters.maxThicknessMm': 'Filter thickness, most',
};

/** Units that end our own field names; the file may have used another one, which stands beside the value. */
const unitAtEnd = /(GyCm2|Gy|Cm2|Mm|Ms|Ma|Deg|PerS|S)$/;

/** The name of a reported value without our unit in it: "tableHeightMm" → "Table height". */
export function nameReported(field: string): string {
  const known = names[field];
  if (known !== undefined) return known;
  const words = field
    .replace(unitAtEnd, '')
    .replace(/([A-Z])/g, ' $1')
    .toLowerCase();
  return words.charAt(0).toUpperCase() + words.slice(1);
}
