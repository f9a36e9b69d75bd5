/** "2026-11-30 17:40", from an ISO time; the reader's zone plays no part. */
export declare const formatDateTime: (iso: string) => string;
/** "2026-11-30". */
export declare const formatDate: (iso: string) => string;
/** "17:40". */
export declare const formatTime: (iso: string) => string;
/** "17:40:08". */
export declare const formatTimeWithSeconds: (iso: string) => string;
/** "Nov 2026", from "2026-11" or a date. */
export declare const formatMonth: (iso: string) => string;
/** Seconds since midnight of the written time, 0..86,399: where a strip's clock starts. */
export declare function readClockS(iso: string): number;
/** An instant of the server's clock (UTC) in the hospital's zone: "2026-11-30 17:40". */
export declare const formatInstant: (iso: string, timeZone: string) => string;
