export interface LocalDateTime {
  /** ISO 8601, the device's own clock: "2026-03-04T09:05:06.5", with the offset appended where there is one. */
  text: string;
  /** "+01:00"; null where the file gives none. */
  utcOffset: string | null;
  /** True if seconds or more were cut off and stand as zero. */
  isImprecise: boolean;
}

const dateTime = /^(\d{4})(\d{2})(\d{2})(?:(\d{2})(?:(\d{2})(?:(\d{2})(\.\d{1,6})?)?)?)?([+-]\d{4})?$/;

function isCalendarDate(year: number, month: number, day: number): boolean {
  if (month < 1 || month > 12 || day < 1) return false;
  return day <= new Date(Date.UTC(year, month, 0)).getUTCDate();
}

/** "+0130" → "+01:30"; null unless within the range of PS3.5 6.2 (-12:00 to +14:00). */
export function formatUtcOffset(text: string | null): string | null {
  const match = /^([+-])(\d{2})(\d{2})$/.exec(text?.trim() ?? '');
  if (!match) return null;
  const [, sign, hours, minutes] = match;
  if (Number(hours) > 14 || Number(minutes) > 59) return null;
  return hours === '00' && minutes === '00' ? '+00:00' : `${sign}${hours}:${minutes}`;
}

/**
 * A date-time (VR DT, PS3.5 6.2) as local ISO 8601 text. It is never moved to another zone; `defaultOffset` is the
 * Timezone Offset From UTC (0008,0201) of the data set, which counts where the value has none. Null if malformed
 * or without a full date. "20260304090506.5" → "2026-03-04T09:05:06.5".
 */
export function parseDateTime(value: string, defaultOffset: string | null): LocalDateTime | null {
  const match = dateTime.exec(value.trim());
  if (!match) return null;
  const [, year, month, day, hour, minute, second, fraction = '', offset] = match;
  if (!isCalendarDate(Number(year), Number(month), Number(day))) return null;
  if (Number(hour ?? 0) > 23 || Number(minute ?? 0) > 59 || Number(second ?? 0) > 60) return null;
  // 60 is a leap second; ISO readers do not take it.
  const wholeSecond = second === '60' ? '59' : (second ?? '00');
  const utcOffset = offset ? formatUtcOffset(offset) : defaultOffset;
  const local = `${year}-${month}-${day}T${hour ?? '00'}:${minute ?? '00'}:${wholeSecond}${fraction}`;
  return { text: local + (utcOffset ?? ''), utcOffset, isImprecise: second === undefined };
}

/** A date (VR DA) and a time (VR TM), also in their retired forms with dots and colons, as one date-time. */
export function joinDateAndTime(
  date: string | null,
  time: string | null,
  defaultOffset: string | null,
): LocalDateTime | null {
  if (date === null) return null;
  const day = date.trim().replaceAll('.', '');
  return (
    parseDateTime(day + (time ?? '').trim().replaceAll(':', ''), defaultOffset) ??
    parseDateTime(day, defaultOffset)
  );
}

/** A date (VR DA) as an ISO date; null if malformed. "19700102" → "1970-01-02". */
export function parseDate(value: string | null): string | null {
  const parsed = value === null ? null : joinDateAndTime(value, null, null);
  return parsed ? parsed.text.slice(0, 10) : null;
}
