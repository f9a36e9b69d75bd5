/**
 * Why a zip archive, or one entry of it, gives no dose report. An entry that cannot be taken out keeps its bytes inside
 * the archive, which is kept as refused files are.
 */
export const archiveReasons = {
  'archive-unreadable': {
    outcome: 'refused',
    sentence:
      'This zip archive is damaged or incomplete, so its table of contents cannot be read. It was kept unread. Make it anew, or hand over the folder itself.',
  },
  'archive-empty': {
    outcome: 'refused',
    sentence:
      'This zip archive holds no file that could be a dose report. It was kept. Check what was packed.',
  },
  'archive-too-many-entries': {
    outcome: 'refused',
    sentence:
      'This zip archive has more entries than one archive may have. It was kept unread. Split it, or hand over the folder itself.',
  },
  'archive-unpacked-size': {
    outcome: 'refused',
    sentence:
      'Unpacked, this zip archive would be larger than one archive may be. It was kept. Split it, or hand over the folder itself.',
  },
  'archive-ratio': {
    outcome: 'refused',
    sentence:
      'This grows on unpacking far more than dose reports do, as archives made to fill a disk would. It was kept unread. Hand over the files themselves.',
  },
  'archive-overlap': {
    outcome: 'refused',
    sentence:
      'Entries of this zip archive share the same bytes, which no honest archive does. It was kept unread. Hand over the files themselves.',
  },
  'archive-nested': {
    outcome: 'refused',
    sentence:
      'This is an archive inside the archive. It was kept. Unpack it first, then hand over what is in it.',
  },
  'archive-entry-path': {
    outcome: 'refused',
    sentence:
      'The path of this entry leads out of the archive or is not written as zip archives write it. It was not unpacked; the archive was kept. Hand over the file itself.',
  },
  'archive-entry-link': {
    outcome: 'refused',
    sentence:
      'This entry is a link or a device, not a file. It was not unpacked; the archive was kept. Hand over the file that it points to.',
  },
  'archive-entry-encrypted': {
    outcome: 'refused',
    sentence:
      'This entry is protected by a password. It was not unpacked; the archive was kept. Pack it without a password, or hand over the file itself.',
  },
  'archive-entry-method': {
    outcome: 'refused',
    sentence:
      'This entry is packed by a method other than the usual one (deflate). It was not unpacked; the archive was kept. Pack it as a plain zip archive, or hand over the file itself.',
  },
  'archive-entry-repeated': {
    outcome: 'refused',
    sentence:
      'An entry of the same path came before in this archive. The first one was read; this one stays in the archive, which was kept. Hand over the file itself if it differs.',
  },
  'archive-entry-size': {
    outcome: 'refused',
    sentence:
      'Unpacked, this entry is larger than one file may be. It was not unpacked; the archive was kept. Ask the physicist.',
  },
  'archive-entry-broken': {
    outcome: 'refused',
    sentence:
      'This entry does not unpack to what the archive says of it, so it was damaged on its way. The archive was kept. Copy the file again from where it came.',
  },
} as const;
