/**
 * Every conversion and every display format, once. Canonical units inside the product: Gy, Gy·cm², s, mm,
 * mA, degrees, kV; scatter in µGy and µSv. A missing value is null and is shown as {@link MISSING}.
 */

/** What stands where a value is missing; never 0. */
export const MISSING = '–';
/** Groups thousands: U+202F, a thin space at which no line breaks; never a comma or a point. */
export const THIN_SPACE = '\u202f';

/** A figure as it is printed: the digits apart from their unit, so that tables can put the unit in the head. */
export type DisplayedFigure = { value: string; unit: string };

/** 1 Gy = 1,000 mGy (SI prefixes). */
export const convertGyToMgy = (kermaGy: number): number => kermaGy * 1_000;
/** 1 mGy = 0.001 Gy. */
export const convertMgyToGy = (kermaMgy: number): number => kermaMgy / 1_000;
/** 1 Gy·m² = 10,000 Gy·cm²; 0.00430 Gy·m² = 43.0 Gy·cm². */
export const convertGyM2ToGyCm2 = (kermaAreaProductGyM2: number): number => kermaAreaProductGyM2 * 10_000;
/** 1 Gy·cm² = 0.0001 Gy·m². */
export const convertGyCm2ToGyM2 = (kermaAreaProductGyCm2: number): number => kermaAreaProductGyCm2 / 10_000;
/** 60 s = 1 min; 390 s = 6.5 min. */
export const convertSecondsToMinutes = (timeS: number): number => timeS / 60;
/** 1 min = 60 s. */
export const convertMinutesToSeconds = (timeMin: number): number => timeMin * 60;
/** Gy/s to mGy/min: × 60,000. */
export const convertGyPerSToMgyPerMin = (rateGyPerS: number): number => rateGyPerS * 60_000;
/** 1 mSv = 1,000 µSv. */
export const convertUSvToMsv = (valueUSv: number): number => valueUSv / 1_000;
/** 1 Sv = 100 rem, hence 1 mSv = 100 mrem. */
export const convertMsvToMrem = (valueMsv: number): number => valueMsv * 100;

/** Groups the integer digits by three with thin spaces: 12345.6 → "12 345.6"; four digits are grouped too. */
export function groupThousands(digits: string): string {
  const [whole = '', fraction] = digits.split('.');
  const grouped = whole.replace(/\B(?=(\d{3})+(?!\d))/g, THIN_SPACE);
  return fraction === undefined ? grouped : `${grouped}.${fraction}`;
}

/** A fixed number of decimals with grouped thousands and a true minus sign (U+2212). */
export function formatDecimals(value: number | null, decimals: number): string {
  if (value === null || !Number.isFinite(value)) return MISSING;
  const digits = groupThousands(Math.abs(value).toFixed(decimals));
  const isNegative = value < 0 && /[1-9]/.test(digits);
  return isNegative ? `\u2212${digits}` : digits;
}

/** A whole number with grouped thousands. */
export const formatInteger = (value: number | null): string => formatDecimals(value, 0);

/**
 * A fixed number of significant digits without exponent: (0.8371, 3) → "0.837", (43, 3) → "43.0",
 * (1234, 3) → "1 230". Zero is "0".
 */
export function formatSignificant(value: number | null, digits: number): string {
  if (value === null || !Number.isFinite(value)) return MISSING;
  if (value === 0) return '0';
  // Rounding may move the value to the next decade (99.96 → 100), so the decade is taken afterwards.
  const rounded = Number(value.toPrecision(digits));
  const decade = Math.floor(Math.log10(Math.abs(rounded)));
  return formatDecimals(rounded, Math.max(0, digits - 1 - decade));
}

/**
 * Reference air kerma K a,r for display: mGy as an integer, from 10,000 mGy on in Gy with two decimals.
 * Below 0.5 mGy one significant digit is kept, so that a small value never reads as zero.
 * 1.42 Gy → 1 420 mGy; 12.345 Gy → 12.35 Gy (half away from zero after binary rounding).
 */
export function formatReferenceAirKerma(referenceAirKermaGy: number | null): DisplayedFigure {
  if (referenceAirKermaGy === null) return { value: MISSING, unit: 'mGy' };
  // Compared after rounding, so that 9,999.7 mGy does not print as "10 000 mGy".
  if (Math.round(convertGyToMgy(referenceAirKermaGy)) >= 10_000) {
    return { value: formatDecimals(referenceAirKermaGy, 2), unit: 'Gy' };
  }
  return { value: formatReferenceAirKermaMgy(referenceAirKermaGy), unit: 'mGy' };
}

/** K a,r in mGy whatever its size: for a column, where units may not be mixed. */
export function formatReferenceAirKermaMgy(referenceAirKermaGy: number | null): string {
  if (referenceAirKermaGy === null) return MISSING;
  const kermaMgy = convertGyToMgy(referenceAirKermaGy);
  return kermaMgy > 0 && kermaMgy < 0.5 ? formatSignificant(kermaMgy, 1) : formatInteger(kermaMgy);
}

/**
 * Air-kerma rate at the reference point in mGy/min (dose-rate index, strip scale): an integer from 10 on, below it two
 * significant digits, so that low-rate fluoroscopy is not all zeros and ones.
 */
export function formatAirKermaRateMgyPerMin(rateMgyPerMin: number | null): string {
  const isLow = rateMgyPerMin !== null && rateMgyPerMin > 0 && rateMgyPerMin < 10;
  return isLow ? formatSignificant(rateMgyPerMin, 2) : formatInteger(rateMgyPerMin);
}

/** Air kerma–area product in Gy·cm², three significant digits: 0.84 → "0.840", 43 → "43.0", 271 → "271". */
export const formatKermaAreaProduct = (kermaAreaProductGyCm2: number | null): string =>
  formatSignificant(kermaAreaProductGyCm2, 3);

/** Fluoroscopy time in minutes with one decimal; a time below three seconds that is not zero reads "< 0.1". */
export function formatFluoroscopyTime(fluoroscopyTimeS: number | null): string {
  if (fluoroscopyTimeS === null) return MISSING;
  const timeMin = convertSecondsToMinutes(fluoroscopyTimeS);
  return timeMin > 0 && timeMin < 0.05 ? '< 0.1' : formatDecimals(timeMin, 1);
}

/** Tube voltage in kV (labelled kVp), an integer. */
export const formatKvp = (kvp: number | null): string => formatInteger(kvp);

/** Peak skin dose in Gy, one decimal; it never stands without its interval. */
export const formatPeakSkinDoseGy = (peakSkinDoseGy: number | null): string =>
  formatDecimals(peakSkinDoseGy, 1);

/** A personal dose equivalent or effective dose in mSv, two decimals. */
export const formatMsv = (valueMsv: number | null): string => formatDecimals(valueMsv, 2);

/** Scatter air kerma (µGy) or its dose equivalent (µSv): two significant digits. */
export const formatScatter = (valueUGyOrUSv: number | null): string => formatSignificant(valueUGyOrUSv, 2);

/** An interval "140–830", both ends to two significant digits; null when an end is missing. */
export function formatScatterInterval(lower: number | null, upper: number | null): string | null {
  if (lower === null || upper === null) return null;
  return `${formatScatter(lower)}–${formatScatter(upper)}`;
}

/** Mean field area at the reference point, P KA / K a,r, in cm², an integer. */
export const formatFieldAreaCm2 = (fieldAreaCm2: number | null): string => formatInteger(fieldAreaCm2);

/** Lead equivalent in mm Pb, two decimals. */
export const formatLeadEquivalentMm = (leadEquivalentMm: number | null): string =>
  formatDecimals(leadEquivalentMm, 2);

/** A share 0..1 in percent: whole numbers from 10 % on, one decimal below and above 99 %. */
export function formatPercent(share: number | null): string {
  if (share === null) return MISSING;
  const percent = share * 100;
  const isNearEnd = (percent > 0 && percent < 9.95) || (percent > 99 && percent < 100);
  return `${formatDecimals(percent, isNearEnd ? 1 : 0)}${THIN_SPACE}%`;
}

/** A length in metres, two decimals: a place in the room, a distance to the isocentre. */
export const formatMetres = (lengthM: number | null): string => formatDecimals(lengthM, 2);

/**
 * Positioner primary angle as the trade says it: + is the detector towards the patient's left (LAO),
 * − towards the right (RAO); DICOM PS3.3 C.8.7.5. 42.4 → "LAO 42°", 0 → "0°".
 */
export function formatPrimaryAngle(primaryAngleDeg: number | null): string {
  return formatAngle(primaryAngleDeg, 'LAO', 'RAO');
}

/** Positioner secondary angle: + cranial (CRA), − caudal (CAU); DICOM PS3.3 C.8.7.5. −15 → "CAU 15°". */
export function formatSecondaryAngle(secondaryAngleDeg: number | null): string {
  return formatAngle(secondaryAngleDeg, 'CRA', 'CAU');
}

function formatAngle(angleDeg: number | null, positive: string, negative: string): string {
  if (angleDeg === null) return MISSING;
  const rounded = Math.round(angleDeg);
  if (rounded === 0) return '0°';
  return `${rounded > 0 ? positive : negative} ${Math.abs(rounded)}°`;
}
