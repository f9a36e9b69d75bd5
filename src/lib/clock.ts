import { DateTime } from 'luxon';

/** Times of the device's clock are shown as written, whatever zone the reader sits in. */
const readWritten = (iso: string): DateTime => DateTime.fromISO(iso, { setZone: true });

/** "2026-11-30 17:40", from an ISO time; the reader's zone plays no part. */
export const formatDateTime = (iso: string): string => readWritten(iso).toFormat('yyyy-MM-dd HH:mm');
/** "2026-11-30". */
export const formatDate = (iso: string): string => readWritten(iso).toFormat('yyyy-MM-dd');
/** "17:40". */
export const formatTime = (iso: string): string => readWritten(iso).toFormat('HH:mm');
/** "17:40:08". */
export const formatTimeWithSeconds = (iso: string): string => readWritten(iso).toFormat('HH:mm:ss');
/** "Nov 2026", from "2026-11" or a date. */
export const formatMonth = (iso: string): string => DateTime.fromISO(iso).toFormat('LLL yyyy');
/** Seconds since midnight of the written time, 0..86,399: where a strip's clock starts. */
export function readClockS(iso: string): number {
  const written = readWritten(iso);
  return written.hour * 3600 + written.minute * 60 + written.second;
}
/** An instant of the server's clock (UTC) in the hospital's zone: "2026-11-30 17:40". */
export const formatInstant = (iso: string, timeZone: string): string =>
  DateTime.fromISO(iso, { zone: timeZone }).toFormat('yyyy-MM-dd HH:mm');
