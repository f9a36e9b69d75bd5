import { caseContent, fluoroscopyEvent } from '../scripts/samples/case-content';
import type { DoseReportContent } from '../server/dicom-writer/dose-report-content';
import { writeDoseReport } from '../server/dicom-writer/write-dose-report';
import type { ProcedureReport } from '../shared/contract/procedure';
import type { Agent } from './test-app';

export type Sent = {
  outcome: string;
  procedureId: string;
  doseReportId: string;
  reason: { code: string } | null;
};

/** Sends a report as a file, and opens what became of it. */
export const createSender = (agent: () => Agent) => {
  const send = async (content: DoseReportContent): Promise<Sent> => {
    const { body } = await agent()
      .post('/api/dose-reports')
      .attach('files', Buffer.from(writeDoseReport(content)), 'report.dcm')
      .expect(200);
    return body.results[0];
  };
  const open = async (id: string) => (await agent().get(`/api/procedures/${id}`).expect(200)).body;
  const standingsOf = async (procedureId: string): Promise<string[]> =>
    ((await open(procedureId)).reports as ProcedureReport[]).map(({ standing }) => standing);
  return { send, open, standingsOf };
};

/** A report of one study with events from..to, each of 0.01 Gy, 1 Gy·cm² and 10 s; its totals add up. */
export function cumulative(
  sample: number,
  report: number,
  from: number,
  to: number,
  overrides: Partial<DoseReportContent> = {},
) {
  const events = Array.from({ length: to - from }, (_, index) =>
    fluoroscopyEvent(sample, from + index, {
      kermaAreaProductGyCm2: 1,
      referenceAirKermaGy: 0.01,
      irradiationDurationS: 10,
    }),
  );
  const base = caseContent(sample);
  return {
    ...base,
    sopInstanceUid: `${base.sopInstanceUid}${report}`,
    contentAt: `2026-03-04T1${report}:20:00`,
    events,
    planes: [
      {
        plane: 'single' as const,
        kermaAreaProductGyCm2: events.length,
        referenceAirKermaGy: events.length * 0.01,
        fluoroscopyTimeS: events.length * 10,
      },
    ],
    ...overrides,
  };
}

/** The same report under the study of another sample; the order stays. */
export const newStudy = (content: DoseReportContent, sample: number): DoseReportContent => ({
  ...content,
  studyInstanceUid: caseContent(sample).studyInstanceUid,
});
/** The same report some hours later. */
export const later = (content: DoseReportContent, hours: number): DoseReportContent => {
  const shift = (text: string) =>
    new Date(new Date(`${text}Z`).getTime() + hours * 3_600_000).toISOString().slice(0, 19);
  return {
    ...content,
    studyAt: shift(content.studyAt),
    contentAt: shift(content.contentAt),
    events: content.events.map((event) => ({ ...event, startedAt: shift(event.startedAt) })),
  };
};

/** The same report with another total than its events have. */
export const withTotal = (content: DoseReportContent, kermaAreaProductGyCm2: number): DoseReportContent => ({
  ...content,
  planes: [{ ...content.planes[0], plane: 'single', kermaAreaProductGyCm2 }],
});
