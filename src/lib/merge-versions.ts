const isSame = (one: unknown, other: unknown): boolean =>
  // An empty field and a value not given are the same to a person.
  JSON.stringify(one === '' ? null : (one ?? null)) === JSON.stringify(other === '' ? null : (other ?? null));

/**
 * Two people edited one record: my changes on top of theirs. What I left as I found it comes from them.
 * Null when there is nothing to bring together: I changed nothing, or they touched no other field.
 */
export function mergeVersions<Values extends object>(
  opened: object,
  mine: Values,
  theirs: Values,
): Values | null {
  const fields = (Object.keys(mine) as (keyof Values)[]).filter((field) => field !== 'version');
  const isMine = (field: keyof Values) => !isSame(mine[field], (opened as Partial<Values>)[field]);
  const isTheirs = (field: keyof Values) => !isMine(field) && !isSame(mine[field], theirs[field]);
  if (!fields.some(isMine) || !fields.some(isTheirs)) return null;
  return { ...theirs, ...Object.fromEntries(fields.filter(isMine).map((field) => [field, mine[field]])) };
}
