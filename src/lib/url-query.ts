export type QueryValues = Record<string, string | number | boolean | null | undefined>;

/** Appends the given values to a path as its query; missing and empty ones are left out. */
export function withQuery(path: string, values: QueryValues): string {
  const query = new URLSearchParams();
  for (const [name, value] of Object.entries(values)) {
    if (value !== null && value !== undefined && value !== '') query.set(name, String(value));
  }
  const text = query.toString();
  return text === '' ? path : `${path}?${text}`;
}
