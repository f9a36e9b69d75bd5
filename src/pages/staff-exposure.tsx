import { useQuery, useSuspenseQueries } from '@tanstack/react-query';
import { useCallback } from 'react';
import { useNavigate } from 'react-router-dom';
import { exposureFilterSchema } from '../../shared/contract/staff-exposure';
import { scopeOf } from '../../shared/permissions';
import { explainExposure } from '../features/exposure/explain-exposure';
import { ExposureLead } from '../features/exposure/exposure-lead';
import { ExposureSentence } from '../features/exposure/exposure-sentence';
import { PersonMargin } from '../features/exposure/person-margin';
import { PointsView } from '../features/exposure/points-view';
import { exposureQueries } from '../features/exposure/queries';
import { ReadingNotes } from '../features/exposure/reading-notes';
import { procedureTypeQueries } from '../features/procedure-types/queries';
import { roomQueries } from '../features/rooms/queries';
import { useUser } from '../features/session/queries';
import { Page } from '../frame/page';
import { useUrlFilter } from '../lib/url-filter';
import { paths } from '../paths';

export function Component() {
  const user = useUser();
  const navigate = useNavigate();
  const [filter, changeFilter] = useUrlFilter(exposureFilterSchema);
  const scope = scopeOf(user, 'staff-exposure.read');
  const [{ data: found }, { data: people }, { data: months }] = useSuspenseQueries({
    queries: [
      exposureQueries.points(filter),
      exposureQueries.people(),
      exposureQueries.months({ person: filter.person, period: filter.period === 'all' ? 'all' : '12m' }),
    ],
  });
  const { data: rooms = [] } = useQuery({
    ...roomQueries.list(),
    enabled: scopeOf(user, 'room.list') !== null,
  });
  const { data: types = [] } = useQuery({
    ...procedureTypeQueries.list(),
    enabled: scopeOf(user, 'procedure-type.list') !== null,
  });
  const openProcedure = useCallback((id: string) => void navigate(paths.procedure(id)), [navigate]);
  const person = people.find(({ id }) => id === filter.person);
  return (
    <Page
      title="Staff exposure"
      heading={
        <ExposureSentence
          filter={filter}
          onChange={changeFilter}
          types={types.map(({ id, name }) => ({ value: id, label: name }))}
          rooms={rooms.map(({ id, code }) => ({ value: id, label: code }))}
          isOwn={scope === 'own'}
        />
      }
      lead={<ExposureLead found={found} personName={scope === 'own' ? undefined : person?.name} />}
      margin={
        <>
          <PersonMargin
            months={months}
            quantity={filter.quantity}
            people={people}
            onChoose={(id) => changeFilter({ person: id })}
          />
          <ReadingNotes isUnnamed={scope === 'masked'} />
        </>
      }
    >
      <PointsView
        found={found}
        quantity={filter.quantity}
        explanation={explainExposure(filter.quantity, found)}
        onOpen={openProcedure}
      />
    </Page>
  );
}
