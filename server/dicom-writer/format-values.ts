import type { Quantity, WrittenNumber } from './written-parts';

/** The shortest decimal string of at most 16 characters (VR DS, PS3.5 6.2) closest to the value. */
export function formatDecimal(value: number): string {
  for (let digits = 15; digits > 0; digits -= 1) {
    const text = String(Number(value.toPrecision(digits)));
    if (text.length <= 16) return text;
  }
  throw new RangeError(`no decimal string for ${value}`);
}

/** What to write: an exact text and unit as they stand, a number divided by its field's factor. */
export function formatQuantity(quantity: Quantity, unit: string, perWrittenUnit: number): WrittenNumber {
  if (typeof quantity !== 'number') return quantity;
  return { text: formatDecimal(Number((quantity / perWrittenUnit).toPrecision(15))), unit };
}

/** "2026-03-04T09:05:06.5+01:00" → "20260304090506.5+0100" (VR DT). */
export function formatDateTime(iso: string): string {
  const [date = '', time = ''] = iso.split('T');
  const offset = /[+-]\d\d:\d\d$/.exec(time)?.[0] ?? '';
  const clock = time.slice(0, time.length - offset.length);
  return date.replaceAll('-', '') + clock.replaceAll(':', '') + offset.replace(':', '');
}

/** The date as VR DA and the time as VR TM. */
export function splitDateTime(iso: string): { date: string; time: string } {
  const [date = '', time = ''] = iso.split('T');
  return { date: date.replaceAll('-', ''), time: time.replaceAll(':', '') };
}
