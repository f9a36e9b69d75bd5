import { useSuspenseQuery } from '@tanstack/react-query';
import { z } from 'zod';
import { jobs } from '../../shared/contract/person';
import { PeopleTable } from '../features/people/people-table';
import { jobChoices } from '../features/people/person-values';
import { personQueries } from '../features/people/queries';
import { AdminPage } from '../frame/admin-page';
import { useSearchText } from '../lib/search-text';
import { useUrlFilter } from '../lib/url-filter';
import { newId, paths } from '../paths';
import { ButtonLink } from '../ui/button';
import { Sentence } from '../ui/sentence';
import { SentenceSelect } from '../ui/sentence-select';
import { TextField } from '../ui/text-field';

const filterSchema = z.object({
  job: z.enum(['any', ...jobs]).default('any'),
  stay: z.enum(['here', 'left', 'either']).default('here'),
  name: z.string().default(''),
});

const stays = [
  { value: 'here', label: 'who work here' },
  { value: 'left', label: 'who have left' },
  { value: 'either', label: 'who work here or have left' },
];

export function Component() {
  const { data: people } = useSuspenseQuery(personQueries.list());
  const [filter, changeFilter] = useUrlFilter(filterSchema);
  const search = useSearchText(filter.name, (name) => changeFilter({ name }));
  const found = people.filter(
    (person) =>
      (filter.job === 'any' || person.job === filter.job) &&
      (filter.stay === 'either' || person.isActive === (filter.stay === 'here')) &&
      `${person.name} ${person.email ?? ''}`.toLowerCase().includes(search.text),
  );
  const signIns = people.filter((person) => person.isActive && person.hasPassword).length;
  return (
    <AdminPage
      title="People"
      heading={
        <Sentence label="Which people are listed">
          People in{' '}
          <SentenceSelect
            label="job"
            value={filter.job}
            choices={[{ value: 'any', label: 'any job' }, ...jobChoices]}
            onChange={(job) => changeFilter({ job: job as typeof filter.job })}
          />{' '}
          <SentenceSelect
            label="working here or not"
            value={filter.stay}
            choices={stays}
            onChange={(stay) => changeFilter({ stay: stay as typeof filter.stay })}
          />
        </Sentence>
      }
      lead={`${people.length} registered, ${signIns} can sign in`}
      deeds={
        <ButtonLink variant="primary" to={paths.person(newId)}>
          Add a person
        </ButtonLink>
      }
    >
      <TextField label="Name or e-mail contains" type="search" className="max-w-sm" {...search.input} />
      <PeopleTable people={found} hrefOf={paths.person} isFiltered={people.length > 0} />
    </AdminPage>
  );
}
