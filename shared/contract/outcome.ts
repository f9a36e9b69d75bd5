import { archiveReasons } from './archive-reasons';

/** Refused: a better reader cannot help. Held: may become readable, or waits for a decision. */
export type UnreadOutcome = 'refused' | 'held';

interface ReasonEntry {
  outcome: UnreadOutcome;
  /** For a technologist: what happened, what was kept, what to do. */
  sentence: string;
}

/** Every reason why a received file gives no dose report. The codes are stable: scripts rely on them. */
export const reasons = {
  ...archiveReasons,
  empty: {
    outcome: 'refused',
    sentence: 'The file is empty. Its name was noted. Export the dose report again and send it once more.',
  },
  'not-dicom': {
    outcome: 'refused',
    sentence:
      'This is not a DICOM file. It was kept unread. Export the dose report as a DICOM structured report, not as text, picture or PDF.',
  },
  truncated: {
    outcome: 'refused',
    sentence:
      'The file breaks off before its end, so part of the exposures would be missing. It was kept unread. Copy it again from the machine or the archive.',
  },
  malformed: {
    outcome: 'refused',
    sentence:
      'The file is DICOM, but its inner structure is broken. It was kept unread. Send the report again from the machine; tell the physicist if that gives the same result.',
  },
  image: {
    outcome: 'refused',
    sentence:
      'This is an image, perhaps a picture of the dose screen. It was kept unread. Send the radiation dose structured report of the same study.',
  },
  'encapsulated-document': {
    outcome: 'refused',
    sentence:
      'This is a document packed in DICOM. It was kept unread. Send the radiation dose structured report of the same study.',
  },
  'not-structured-report': {
    outcome: 'refused',
    sentence:
      'This DICOM object is not a structured report. It was kept unread. Send the radiation dose structured report of the same study.',
  },
  'ct-report': {
    outcome: 'refused',
    sentence:
      'This is the dose report of a CT scanner. It was kept unread. Only projection X-ray is recorded here.',
  },
  'mammography-report': {
    outcome: 'refused',
    sentence:
      'This is the dose report of a mammography unit. It was kept unread. Only fluoroscopy and radiography are recorded here.',
  },
  'radiopharmaceutical-report': {
    outcome: 'refused',
    sentence:
      'This is the dose report of a radiopharmaceutical. It was kept unread. Only projection X-ray is recorded here.',
  },
  'prose-report': {
    outcome: 'refused',
    sentence:
      'This is a written findings report without dose values. It was kept unread. Send the radiation dose structured report of the same study.',
  },
  'transfer-syntax-unknown': {
    outcome: 'held',
    sentence:
      'The file is encoded in a way that Leeward does not know. It was kept and can be read again later. Export it as explicit or implicit little endian, or ask the physicist.',
  },
  'limit-inflated-size': {
    outcome: 'held',
    sentence:
      'Unpacked, the file would be larger than a dose report can sensibly be. It was kept. The physicist decides whether it may be read.',
  },
  'limit-depth': {
    outcome: 'held',
    sentence:
      'The report is nested more deeply than a dose report can sensibly be. It was kept. The physicist decides whether it may be read.',
  },
  'limit-items': {
    outcome: 'held',
    sentence:
      'The report has more entries than a dose report can sensibly have. It was kept. The physicist decides whether it may be read.',
  },
  'limit-text-length': {
    outcome: 'held',
    sentence:
      'The report holds a text longer than a dose report can sensibly have. It was kept. The physicist decides whether it may be read.',
  },
  'limit-time': {
    outcome: 'held',
    sentence: 'Reading the report took too long and was stopped. It was kept and can be read again later.',
  },
  'limit-memory': {
    outcome: 'held',
    sentence:
      'Reading the report needed more memory than a dose report can sensibly need. It was kept. The physicist decides whether it may be read.',
  },
  'no-content': {
    outcome: 'held',
    sentence:
      'The report has neither totals nor exposures. It was kept. Check on the machine whether the case was closed before the report was sent.',
  },
  'other-template': {
    outcome: 'held',
    sentence:
      'This structured report follows a template that Leeward does not read. It was kept and can be read again later. Send the radiation dose structured report of the same study.',
  },
  'enhanced-report': {
    outcome: 'held',
    sentence:
      'This is an Enhanced X-Ray Radiation Dose report, a newer form that Leeward does not read yet. It was kept and can be read again later. If the machine offers it, send the normal radiation dose report too.',
  },
  'sop-instance-conflict': {
    outcome: 'held',
    sentence:
      'A report with the same identity but other content is already stored. Both were kept, nothing was overwritten. The physicist decides which one counts.',
  },
  'sop-instance-declined': {
    outcome: 'held',
    sentence:
      'The physicist compared this report with the stored one of the same identity and let the stored one count. Both are kept, and it can be decided anew.',
  },
  'sop-instance-replaced': {
    outcome: 'held',
    sentence:
      'The physicist put another report of the same identity in the place of this one. Both are kept, and this one can be put back.',
  },
  'reader-failure': {
    outcome: 'held',
    sentence:
      'Reading the file failed for a reason on our side. It was kept and can be read again later. Tell the administrator if it happens again.',
  },
} as const satisfies Record<string, ReasonEntry>;

export type ReasonCode = keyof typeof reasons;
export const reasonCodes = Object.keys(reasons) as ReasonCode[];

export const outcomeOfReason = (code: ReasonCode): UnreadOutcome => reasons[code].outcome;
export const sentenceOfReason = (code: ReasonCode): string => reasons[code].sentence;

/** What a warning of the reader says; its detail names the field and, where it helps, the events. */
export const warningSentences = {
  'value-missing': 'The report lacks a value that it should have; it counts as unknown, not as zero.',
  'value-empty': 'The report has a place for a value but leaves it empty.',
  'value-repeated': 'A value that should stand once stands several times; the first one is taken.',
  'value-list': 'Several numbers stand in one entry; each is taken as a value of its own.',
  'number-unreadable': 'A number is not written as DICOM writes numbers; it counts as unknown.',
  'unit-missing': 'A number has no unit; it counts as unknown.',
  'unit-unknown': 'A number has a unit that Leeward does not know; it counts as unknown.',
  'event-type-unknown': 'The kind of exposure is not one of the standard ones.',
  'plane-unknown': 'The plane is not one of the standard ones.',
  'code-unknown': 'A coded value is not one of the standard ones; its meaning is kept.',
  'event-duplicate': 'Two exposures carry the same identifier and plane.',
  'events-missing': 'The report has totals but no exposures.',
  'totals-missing': 'The report has exposures but no totals.',
  'procedure-unknown': 'The kind of procedure reported is missing or not a standard one.',
  'date-time-unreadable': 'A date or time is not written as DICOM writes it; it counts as unknown.',
  'date-time-imprecise': 'A time is cut short; the missing part is taken as zero.',
  'character-set-undeclared': 'Text uses letters beyond ASCII without saying in which character set.',
  'character-set-unknown': 'The declared character set is not a DICOM one.',
  'character-set-wrong': 'Text does not fit the declared character set.',
  'uid-invalid': 'A unique identifier is not written as DICOM writes it.',
  'syntax-mismatch': 'The file is encoded in another way than it declares; it was read as it is encoded.',
  'no-meta-header': 'The file lacks its leading part; its encoding was found from the first element.',
  'completion-partial': 'The report says of itself that it is only partial.',
} as const;

export type WarningCode = keyof typeof warningSentences;
