/** The smaller pieces of what the writer puts into a dose report. */

/**
 * The exact decimal string and unit code to write (a unit of null leaves it out, its scheme is UCUM by default), with
 * the same number as a floating-point value where `precise` is given; or no value and the reason for it.
 */
export type WrittenNumber =
  { text: string; unit: string | null; scheme?: string; precise?: number } | { qualifier: WrittenCode };

/** A number in the unit of the field's name, or exactly what to write. */
export type Quantity = number | WrittenNumber;
export type Maybe<T> = T | null;

/** Code value, coding scheme designator, code meaning. */
export interface WrittenCode {
  value: string;
  scheme: string;
  meaning: string;
}

/** An image that an item refers to; without frame numbers all of it. */
export interface WrittenImage {
  sopClassUid: string;
  sopInstanceUid: string;
  frameNumbers?: number[];
}

export interface WrittenPerson {
  /** As a DICOM person name: family^given^middle^prefix^suffix. */
  name: string;
  /** Role in procedure (CID 7453 and others), for example 113851 Irradiation Administering. */
  role: WrittenCode;
  id?: Maybe<string>;
  idIssuer?: Maybe<string>;
  organization?: Maybe<string>;
  organizationRole?: Maybe<WrittenCode>;
}

/** TID 1003. */
export interface WrittenPersonObserver {
  name: string;
  loginName?: Maybe<string>;
  organization?: Maybe<string>;
  organizationRole?: Maybe<WrittenCode>;
  role?: Maybe<WrittenCode>;
  roleIdentifier?: Maybe<string>;
}

export interface WrittenCalibration {
  /** ISO 8601 local time. */
  calibratedAt: string;
  factor: Quantity;
  uncertaintyPercent: Quantity;
  responsibleParty: string;
  protocol?: Maybe<string>;
}
