import { useSuspenseQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { idSchema } from '../../shared/contract/common';
import type { Procedure } from '../../shared/contract/procedure';
import { can, scopeOf } from '../../shared/permissions';
import { EnteredSection } from '../features/manual-entry/entered-section';
import { ChecksNote } from '../features/data-checks/checks-note';
import { FindingsSection } from '../features/data-checks/findings-section';
import { AttentionReasons } from '../features/procedure/attention-reasons';
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
import { RegroupDeeds } from '../features/regrouping/regroup-deeds';
import { useSession, useUser } from '../features/session/queries';
import { NotFound } from '../frame/not-found';
import { Page } from '../frame/page';
import { paths } from '../paths';
import { ButtonLink } from '../ui/button';
import { EmptyState } from '../ui/empty-state';
import { EnteredByHand } from '../ui/entered-by-hand';

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
  if (procedure.mergedInto) return <EmptiedProcedure procedure={procedure} heir={procedure.mergedInto} />;
  return (
    <Page
      title={nameProcedure(procedure)}
      eyebrow={describePlace(procedure)}
      lead={<Lead procedure={procedure} />}
      deeds={
        <>
          {canEnter(user, procedure) && (
            <ButtonLink to={paths.enterFigures(procedure.id)}>Enter the figures by hand</ButtonLink>
          )}
          {canComplete && recordLink}
        </>
      }
      margin={<Margin procedure={procedure} />}
    >
      <TotalsSection procedure={procedure} />
      <Findings procedure={procedure} />
      <EnteredFigures procedure={procedure} />
      {!procedure.isManual && <EventsSection procedure={procedure} />}
      <ExposureSection
        procedureId={procedure.id}
        next={
          !isComplete && (canComplete ? recordLink : 'A technologist or the physicist completes the record.')
        }
      />
    </Page>
  );
}

/** Its reports went to another procedure: nothing is left to show but its record and its history. */
function EmptiedProcedure({
  procedure,
  heir,
}: {
  procedure: Procedure;
  heir: NonNullable<Procedure['mergedInto']>;
}) {
  const user = useUser();
  const hasRecord = procedure.recordState === 'complete' && can(user, 'procedure.complete');
  return (
    <Page
      title={nameProcedure(procedure)}
      eyebrow={describePlace(procedure)}
      lead={<Lead procedure={procedure} />}
      deeds={
        hasRecord && <ButtonLink to={paths.procedureRecord(procedure.id)}>Look at its record</ButtonLink>
      }
      margin={<Margin procedure={procedure} />}
    >
      <EmptyState title={`Its dose reports are in ${heir.caseNumber}`}>
        <p className="flex flex-col items-start gap-3">
          Totals, exposures and staff exposure stand there. The physicist can take this back; everything is
          then as it was.
          <ButtonLink to={paths.procedure(heir.id)}>Open {heir.caseNumber}</ButtonLink>
        </p>
      </EmptyState>
    </Page>
  );
}

function Findings({ procedure }: { procedure: Procedure }) {
  const user = useUser();
  const { hospital } = useSession();
  return (
    <FindingsSection
      procedure={procedure}
      timeZone={hospital?.timeZone ?? 'UTC'}
      canSettle={can(user, 'data-check.settle')}
    />
  );
}

/** Where no report tells any figure. */
const canEnter = (
  user: Parameters<typeof can>[0],
  { planes, eventCount, isManual, isWithdrawn }: Procedure,
) =>
  can(user, 'procedure.enter-by-hand') &&
  !isManual &&
  !isWithdrawn &&
  eventCount === 0 &&
  planes.every(({ displayed }) => Object.values(displayed).every((value) => value === null));

function EnteredFigures({ procedure }: { procedure: Procedure }) {
  const user = useUser();
  const { hospital } = useSession();
  if (!procedure.isManual && !procedure.reports.some(({ isManual }) => isManual)) return null;
  return (
    <EnteredSection
      procedureId={procedure.id}
      timeZone={hospital?.timeZone ?? 'UTC'}
      isCounted={procedure.isManual}
      correct={
        can(user, 'procedure.enter-by-hand')
          ? (entryId) => (
              <ButtonLink isSmall to={paths.correctEntry(procedure.id, entryId)}>
                Correct what was typed
              </ButtonLink>
            )
          : null
      }
    />
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
    {procedure.isManual && (
      <p className="text-base text-ink">
        <EnteredByHand words="Entered by hand: no report came." />
      </p>
    )}
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
      <ChecksNote checks={procedure.dataChecks} />
      <FactorsNote
        planes={procedure.planes}
        machineHref={can(user, 'equipment.edit') ? paths.machine : null}
      />
      <ReportedSummedNote planes={procedure.planes} />
      <ReportsNote
        reports={procedure.reports}
        timeZone={timeZone}
        originalHref={can(user, 'dose-report.download') ? (id) => `/api/dose-reports/${id}/original` : null}
        deeds={can(user, 'procedure.regroup') && <RegroupDeeds procedure={procedure} timeZone={timeZone} />}
      />
      {can(user, 'procedure.complete') && (
        <MarksNote procedure={procedure} canClassify={can(user, 'procedure.classify')} canWithdraw />
      )}
      <HistoryNote history={procedure.history} timeZone={timeZone} />
    </>
  );
}
