import { randomUUID } from 'node:crypto';

/** A UID made from a random UUID (PS3.5 annex B.2). */
export const newUid = (): string => `2.25.${BigInt(`0x${randomUUID().replaceAll('-', '')}`)}`;
