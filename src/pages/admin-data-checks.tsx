import { useSuspenseQuery } from '@tanstack/react-query';
import { can } from '../../shared/permissions';
import { dataCheckQueries } from '../features/data-checks/queries';
import { RulesTable } from '../features/data-checks/rules-table';
import { useUser } from '../features/session/queries';
import { AdminPage } from '../frame/admin-page';
import { withQuery } from '../lib/url-query';
import { paths } from '../paths';
import { TextLink } from '../ui/text-link';

export function Component() {
  const user = useUser();
  const { data: rules } = useSuspenseQuery(dataCheckQueries.list());
  return (
    <AdminPage
      title="Data checks"
      lead={
        <p className="max-w-[44rem]">
          Every procedure is held against these rules whenever it is computed. A hard finding keeps it out of
          every statistic until a physicist decides; levels count all the same.{' '}
          {can(user, 'data-check.settle') && (
            <TextLink to={withQuery(paths.procedures, { period: 'all', attention: 'in-doubt' })}>
              Procedures with a value in doubt
            </TextLink>
          )}
        </p>
      }
    >
      <RulesTable rules={rules} hrefOf={paths.dataCheck} />
    </AdminPage>
  );
}
