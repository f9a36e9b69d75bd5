import { useCallback, useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';
import type { ScatterArea } from '../../charts/scatter.types';
import type { Sort } from '../../ui/data-table.types';
import { readArea, writeArea } from './chosen-area';
import { highestFirst, readSort } from './sort-points';

/** What was chosen in the chart and how the list is sorted, kept in the address. */
export function usePointsView() {
  const [query, setQuery] = useSearchParams();
  const areaText = query.get('area');
  const area = useMemo(() => readArea(areaText), [areaText]);
  const change = useCallback(
    (values: Record<string, string | null>) =>
      setQuery(
        (current) => {
          const next = new URLSearchParams(current);
          for (const [name, value] of Object.entries(values))
            if (value === null) next.delete(name);
            else next.set(name, value);
          return next;
        },
        { preventScrollReset: true },
      ),
    [setQuery],
  );
  const chooseArea = useCallback(
    (chosen: ScatterArea | null) => {
      const text = chosen && writeArea(chosen);
      if (text !== areaText) change({ area: text });
    },
    [areaText, change],
  );
  const sortBy = ({ key, order }: Sort) =>
    change({
      sort: key === highestFirst.key ? null : key,
      order: order === highestFirst.order ? null : order,
    });
  return { area, chooseArea, sort: readSort(query), sortBy };
}
