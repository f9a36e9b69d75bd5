import { useShownTheme } from '../lib/theme';

const names = [
  'paper',
  'surface',
  'ink',
  'ink-2',
  'rule',
  'edge',
  'lee',
  'beacon',
  'sounding',
  'heather',
] as const;
const rampNames = ['ramp-1', 'ramp-2', 'ramp-3', 'ramp-4', 'ramp-5'] as const;

export type ChartColours = Record<(typeof names)[number], string> & { ramp: string[] };

const known = new Map<string, ChartColours>();

/** The theme's colours as a canvas needs them: resolved, for it knows neither variables nor light-dark(). */
export function useChartColours(): ChartColours {
  const theme = useShownTheme();
  const colours = known.get(theme) ?? readColours();
  known.set(theme, colours);
  return colours;
}

function readColours(): ChartColours {
  const probe = document.createElement('span');
  probe.hidden = true;
  document.body.append(probe);
  const read = (name: string): string => {
    probe.style.color = `var(--color-${name})`;
    return getComputedStyle(probe).color;
  };
  const entries = names.map((name) => [name, read(name)] as const);
  const colours = { ...Object.fromEntries(entries), ramp: rampNames.map(read) } as ChartColours;
  probe.remove();
  return colours;
}
