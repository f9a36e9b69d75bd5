import type { Procedure } from '../shared/contract/procedure';
import type { GroupedState, RegroupingLine, RegroupPreview } from '../shared/contract/regrouping';
import type { DoseReportContent } from '../server/dicom-writer/dose-report-content';
import { describeState } from '../server/regrouping/describe-state';
import { createSender, cumulative, later, newStudy } from './report-series';
import type { Agent, TestApp } from './test-app';

type Body = Record<string, unknown>;

/** Without an order's number, so that only a person puts studies together. */
export const orderless = (content: DoseReportContent) => ({ ...content, accessionNumber: null });

/** What a physicist does with the reports of procedures. */
export const createRegrouper = (agent: () => Agent, app: () => TestApp, hospitalId: () => string) => {
  const sender = createSender(agent);
  const openOne = (id: string): Promise<Procedure> => sender.open(id);
  const versionOf = async (id: string) => (await openOne(id)).record.version;
  const stateOf = (id: string): Promise<GroupedState> =>
    describeState(app().dataSource.manager, hospitalId(), id);
  const statesOf = (...ids: string[]) => Promise.all(ids.map(stateOf));

  const post = (path: string, body: Body) =>
    agent()
      .post(`/api/${path}`)
      .send({ reason: 'one case', ...body });
  const between = async (source: string, target: string) => ({
    targetId: target,
    version: await versionOf(source),
    targetVersion: await versionOf(target),
  });
  const merge = async (source: string, target: string) =>
    post(`procedures/${source}/merge`, await between(source, target));
  const move = async (source: string, target: string, doseReportIds: string[]) =>
    post(`procedures/${source}/move`, { ...(await between(source, target)), doseReportIds });
  const split = async (source: string, doseReportIds: string[]) =>
    post(`procedures/${source}/split`, { version: await versionOf(source), doseReportIds });
  const listOf = async (id: string): Promise<RegroupingLine[]> =>
    (await agent().get(`/api/procedures/${id}/regroupings`).expect(200)).body.items;
  const takeBack = async (regroupingId: string, id: string) => {
    const line = (await listOf(id)).find((one) => one.id === regroupingId) as RegroupingLine;
    const { sourceVersion, targetVersion } = line;
    return post(`regroupings/${regroupingId}/undo`, { sourceVersion, targetVersion });
  };
  const preview = async (id: string, body: Body): Promise<RegroupPreview> =>
    (
      await post(`procedures/${id}/regroup-preview`, { targetId: null, doseReportIds: [], ...body }).expect(
        200,
      )
    ).body;
  const reportIds = async (id: string) => (await openOne(id)).reports.map((report) => report.id);

  /** Two studies of one patient, of 10 and of 15 exposures, an hour apart. */
  async function sendTwoStudies(sample: number) {
    const first = await sender.send(orderless(cumulative(sample, 0, 0, 10)));
    const content = orderless(later(newStudy(cumulative(sample, 1, 10, 25), sample + 1), 1));
    const second = await sender.send(content);
    return [first.procedureId, second.procedureId] as const;
  }

  return {
    ...sender,
    openOne,
    versionOf,
    statesOf,
    stateOf,
    post,
    between,
    merge,
    move,
    split,
    listOf,
    takeBack,
    preview,
    reportIds,
    sendTwoStudies,
  };
};
