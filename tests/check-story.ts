import type { DoseReportContent } from '../server/dicom-writer/dose-report-content';
import { writeDoseReport } from '../server/dicom-writer/write-dose-report';
import { caseContent } from '../scripts/samples/case-content';
import type { DataCheck } from '../shared/contract/data-check';
import type { Procedure } from '../shared/contract/procedure';
import { makeGarment, makeHospital, makePerson, makeProcedureType, testPassword } from './factories';
import { signIn, startTestApp, type Agent } from './test-app';

/** A hospital with a physicist, a technologist, an operator, a garment and a procedure type that reports are given. */
export async function startCheckStory() {
  const app = await startTestApp();
  const { dataSource } = app;
  const hospitalId = await makeHospital(dataSource);
  const person = (email: string, overrides: Parameters<typeof makePerson>[2]) =>
    makePerson(dataSource, hospitalId, { email, ...overrides });
  await person('p@example.org', { name: 'P-01', roles: ['physicist'] });
  await person('t@example.org', { name: 'T-01', roles: ['technologist'] });
  const operatorId = await person('o@example.org', { name: 'IR-1', roles: ['interventionalist'] });
  const garmentId = await makeGarment(dataSource, hospitalId);
  const typeId = await makeProcedureType(dataSource, hospitalId, { name: 'Hepatic arteriography' });
  const as = (email: string) => signIn(app.app, email, testPassword);
  const [physicist, technologist, operator] = [
    await as('p@example.org'),
    await as('t@example.org'),
    await as('o@example.org'),
  ];
  const open = async (id: string, agent: Agent = physicist): Promise<Procedure> =>
    (await agent.get(`/api/procedures/${id}`).expect(200)).body;
  return {
    app,
    operatorId,
    garmentId,
    typeId,
    physicist,
    technologist,
    operator,
    open,
    /** Sends a report; the procedure that it is stored in. */
    async send(content: DoseReportContent): Promise<Procedure> {
      const { body } = await technologist
        .post('/api/dose-reports')
        .attach('files', Buffer.from(writeDoseReport(content)), 'report.dcm')
        .expect(200);
      if (body.results[0].outcome !== 'stored') throw new Error(JSON.stringify(body.results[0]));
      return open(body.results[0].procedureId);
    },
    /** Decides about every hard finding of a procedure, as its page does. */
    settle: (procedure: Procedure, decision: object, agent: Agent = physicist) =>
      agent.post(`/api/procedures/${procedure.id}/check-settlements`).send({
        findings: procedure.dataChecks
          .filter(({ result }) => result === 'failed')
          .map(({ code, finding }) => ({ ruleCode: code, finding })),
        decision: 'right',
        corrected: null,
        reason: 'compared with the screen',
        ...decision,
      }),
  };
}
export type CheckStory = Awaited<ReturnType<typeof startCheckStory>>;

let sample = 400;
export const currentSample = (): number => sample;

/** A report of totals without events on its own day of March; every call is another study. */
export function totalsOf(
  day: number,
  kermaAreaProductGyCm2: number,
  referenceAirKermaGy = 0.35,
): DoseReportContent {
  sample += 1;
  const at = (clock: string) => `2026-03-${String(day).padStart(2, '0')}T${clock}`;
  return {
    ...caseContent(sample),
    studyAt: at('09:00:00'),
    contentAt: at('10:00:00'),
    events: [],
    planes: [{ plane: 'single', kermaAreaProductGyCm2, referenceAirKermaGy, fluoroscopyTimeS: 390 }],
  };
}

export function checkOf(procedure: Procedure, code: string): DataCheck {
  const check = procedure.dataChecks.find((one) => one.code === code);
  if (!check) throw new Error(`No ${code}`);
  return check;
}

/** A decision that types some totals. */
export const corrected = (figures: object) => ({
  decision: 'corrected',
  corrected: { referenceAirKermaGy: null, kermaAreaProductGyCm2: null, fluoroscopyTimeS: null, ...figures },
});
