import { useSuspenseQuery } from '@tanstack/react-query';
import { DateTime } from 'luxon';
import { useParams } from 'react-router-dom';
import { can } from '../../shared/permissions';
import { dataCheckQueries } from '../features/data-checks/queries';
import { RecomputeNote } from '../features/data-checks/recompute-note';
import { RuleFacts } from '../features/data-checks/rule-facts';
import { RuleForm } from '../features/data-checks/rule-form';
import { SettingsTable } from '../features/data-checks/settings-table';
import { useSession, useUser } from '../features/session/queries';
import { AdminPage } from '../frame/admin-page';
import { NotFound } from '../frame/not-found';
import { Section } from '../ui/margin-note';

export function Component() {
  const { code = '' } = useParams();
  const user = useUser();
  const { hospital } = useSession();
  const timeZone = hospital?.timeZone ?? 'UTC';
  const { data: rules } = useSuspenseQuery(dataCheckQueries.list());
  const rule = rules.find((one) => one.code === code);
  if (!rule) return <NotFound />;
  const canEdit = can(user, 'data-check.edit');
  return (
    <AdminPage
      title={rule.name}
      eyebrow="Data checks"
      lead={
        <div className="flex max-w-[44rem] flex-col gap-1">
          <p>{rule.looksAt}</p>
          <p>What to do: {rule.remedy}</p>
        </div>
      }
      margin={<RuleFacts rule={rule} />}
    >
      <Section title="Open findings">
        <RecomputeNote rule={rule} canEdit={canEdit} />
      </Section>
      {canEdit && (
        <Section title="Set the rule" note="earlier settings stay; the newest that has begun holds">
          <RuleForm key={rule.code} rule={rule} today={DateTime.now().setZone(timeZone).toISODate() ?? ''} />
        </Section>
      )}
      <Section title="Settings so far">
        <SettingsTable rule={rule} timeZone={timeZone} />
      </Section>
      {!canEdit && <p className="text-sm text-ink-2">A medical physicist sets the rules.</p>}
    </AdminPage>
  );
}
