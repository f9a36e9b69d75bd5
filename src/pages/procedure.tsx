import { useSuspenseQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { idSchema } from '../../shared/contract/common';
import type { Procedure } from '../../shared/contract/procedure';
import { can, scopeOf } from '../../shared/permissions';
import { AttentionReasons } from '../features/procedure/attention-reasons';
import { DataChecksNote } from '../features/procedure/data-checks-note';
import { EventsSection } from '../features/procedure/events-section';
import { ExposureSection } from '../features/procedure/exposure-section';
import { FactorsNote } from '../features/procedure/factors-note';
import { HistoryNote } from '../features/procedure/history-note';
import { MarksNote } from '../features/procedure/marks-note';
import { PatientNote } from '../features/procedure/patient-note';
import { classNames, describePlace, nameProcedure } from '../features/procedure/procedure-words';
import { procedureQueries } from '../features/procedure/queries';
import { ReportedSummedNote } from '../features/procedure/reported-summed-note';
import { ReportsNote } from '../features/procedure/reports-note';
import { TotalsSection } from '../features/procedure/totals-section';
import { useSession, useUser } from '../features/session/queries';
import { NotFound } from '../frame/not-found';
import { Page } from '../frame/page';
import { paths } from '../paths';
import { ButtonLink } from '../ui/button';

export function Component() {
  const { id = '' } = useParams();
  return idSchema.safeParse(id).success ? <OpenedProcedure key={id} id={id} /> : <NotFound />;
}

function OpenedProcedure({ id }: { id: string }) {
  const { data: procedure } = useSuspenseQuery(procedureQueries.detail(id));
  return <ProcedurePage procedure={procedure} />;
}

function ProcedurePage({ procedure }: { procedure: Procedure }) {
  const user = useUser();
  const canComplete = can(user, 'procedure.complete');
  const isComplete = procedure.recordState === 'complete';
  const recordLink = (
    <ButtonLink variant={isComplete ? 'secondary' : 'primary'} to={paths.procedureRecord(procedure.id)}>
      {isComplete ? 'Correct the record' : 'Complete the record'}
    </ButtonLink>
  );
  return (
    <Page
      title={nameProcedure(procedure)}
      eyebrow={describePlace(procedure)}
      lead={<Lead procedure={procedure} />}
      deeds={canComplete && recordLink}
      margin={<Margin procedure={procedure} />}
    >
      <TotalsSection procedure={procedure} />
      <EventsSection procedure={procedure} />
      <ExposureSection
        procedureId={procedure.id}
        next={
          !isComplete && (canComplete ? recordLink : 'A technologist or the physicist completes the record.')
        }
      />
    </Page>
  );
}

const Lead = ({ procedure }: { procedure: Procedure }) => (
  <div className="flex flex-col gap-1.5">
    <p>
      {[
        procedure.primaryOperator ? `Operator ${procedure.primaryOperator.name}` : 'operator not recorded',
        procedure.procedureType && procedure.studyDescription ? `“${procedure.studyDescription}”` : null,
        procedure.procedureClass === 'clinical' ? null : classNames[procedure.procedureClass].toLowerCase(),
        procedure.deviceClass === 'radiography' ? 'radiography' : null,
      ]
        .filter(Boolean)
        .join(' · ')}
    </p>
    {procedure.isWithdrawn && (
      <p className="font-semibold text-ink">Withdrawn: it counts in no list and no statistic.</p>
    )}
    <AttentionReasons attention={procedure.attention} />
  </div>
);

function Margin({ procedure }: { procedure: Procedure }) {
  const user = useUser();
  const { hospital } = useSession();
  const timeZone = hospital?.timeZone ?? 'UTC';
  const patientScope = scopeOf(user, 'procedure.read-patient');
  return (
    <>
      {patientScope !== null && (
        <PatientNote procedureId={procedure.id} isShownAtOnce={user.roles.includes('technologist')} />
      )}
      <DataChecksNote checks={procedure.dataChecks} />
      <FactorsNote
        planes={procedure.planes}
        machineHref={can(user, 'equipment.edit') ? paths.machine : null}
      />
      <ReportedSummedNote planes={procedure.planes} />
      <ReportsNote
        reports={procedure.reports}
        timeZone={timeZone}
        originalHref={can(user, 'dose-report.download') ? (id) => `/api/dose-reports/${id}/original` : null}
      />
      {can(user, 'procedure.complete') && (
        <MarksNote procedure={procedure} canClassify={can(user, 'procedure.classify')} canWithdraw />
      )}
      <HistoryNote history={procedure.history} timeZone={timeZone} />
    </>
  );
}
