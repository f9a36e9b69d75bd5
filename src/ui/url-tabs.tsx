import { Link, useSearchParams } from 'react-router-dom';
import { joinClassNames } from '../lib/class-names';

type Tab = { key: string; name: string; count?: number };

/** The chosen tab from the address (`?tab=`); the first one where the address is silent or wrong. */
export function useUrlTab<Key extends string>(keys: readonly [Key, ...Key[]], name = 'tab'): Key {
  const [query] = useSearchParams();
  return keys.find((key) => key === query.get(name)) ?? keys[0];
}

/** Parts of one page, each with an address of its own: links, not widgets, so Back works. */
export function UrlTabs({
  tabs,
  label,
  name = 'tab',
}: {
  tabs: readonly Tab[];
  label: string;
  name?: string;
}) {
  const [query] = useSearchParams();
  const chosen = tabs.find((tab) => tab.key === query.get(name))?.key ?? tabs[0]?.key;
  return (
    <nav aria-label={label} className="border-b border-rule">
      <ul className="flex flex-wrap gap-x-6">
        {tabs.map((tab) => (
          <li key={tab.key}>
            <Link
              to={{ search: findSearch(query, name, tab.key) }}
              preventScrollReset
              aria-current={tab.key === chosen ? 'page' : undefined}
              className={joinClassNames(
                'inline-block border-b-3 py-2',
                tab.key === chosen
                  ? 'border-lee font-semibold text-ink'
                  : 'border-transparent text-ink-2 hover:text-ink',
              )}
            >
              {tab.name}
              {tab.count !== undefined && <span className="ml-1.5 text-sm text-ink-2">{tab.count}</span>}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}

function findSearch(query: URLSearchParams, name: string, key: string): string {
  const next = new URLSearchParams(query);
  next.set(name, key);
  return next.toString();
}
