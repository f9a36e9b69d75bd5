import { expect, test } from 'vitest';
import { writeOutcomeList } from './outcome-list';
import type { Upload } from './upload.types';

const base: Upload = {
  key: 1,
  uploadKey: 'k',
  file: new File([], 'a.dcm'),
  path: 'cases/a.dcm',
  state: 'waiting',
  share: 0,
  results: [],
  archive: null,
  failure: null,
};
const id = '01a23224-9820-77e4-98cc-2d1097811b84';

test('each file stands with its folder, outcome, reason and procedure', () => {
  const list = writeOutcomeList(
    [
      {
        ...base,
        state: 'answered',
        results: [{ fileName: 'a.dcm', outcome: 'stored', doseReportId: id, procedureId: id, reason: null }],
      },
      {
        ...base,
        path: 'b.png',
        state: 'answered',
        results: [
          {
            fileName: 'b.png',
            outcome: 'refused',
            doseReportId: id,
            procedureId: null,
            reason: { code: 'not-dicom', detail: 'This is a picture (PNG), not a DICOM file.' },
          },
        ],
      },
    ],
    'https://leeward.example',
  );
  expect(list.split('\r\n')).toEqual([
    'File,Archive,Outcome,Reason code,Reason,Procedure',
    `cases/a.dcm,,stored,,,https://leeward.example/procedures/${id}`,
    'b.png,,refused,not-dicom,"This is a picture (PNG), not a DICOM file.",',
    '',
  ]);
});

test('the entries of an archive stand one by one, and what was left out with them', () => {
  const archive = {
    id,
    fileName: 'z.zip',
    state: 'unpacked' as const,
    entryCount: 1,
    settledCount: 1,
    skipped: [{ path: 'in/', reason: 'a folder' }],
  };
  const results = [
    {
      fileName: 'in/x.dcm',
      archiveName: 'z.zip',
      outcome: 'duplicate' as const,
      doseReportId: id,
      procedureId: null,
      reason: null,
    },
  ];
  const list = writeOutcomeList([{ ...base, path: 'z.zip', state: 'answered', results, archive }], '');
  expect(list).toContain('in/x.dcm,z.zip,already here,,,\r\nin/,z.zip,skipped,,a folder,\r\n');
});

test('a name that a spreadsheet would take for a formula stays a name', () => {
  expect(writeOutcomeList([{ ...base, path: '=cmd|calc' }], '')).toContain(`\r\n'=cmd|calc,`);
});
