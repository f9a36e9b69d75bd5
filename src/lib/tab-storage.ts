/** Something kept in this browser tab only; a tab that may not store keeps nothing, and nothing breaks. */
export const tabStorage = {
  /** Null where there is nothing, or nothing that can be read. */
  read(key: string): unknown {
    try {
      return JSON.parse(sessionStorage.getItem(key) ?? 'null');
    } catch {
      return null;
    }
  },
  keep(key: string, value: unknown): void {
    try {
      sessionStorage.setItem(key, JSON.stringify(value));
    } catch {
      // Closed or full storage: what was typed stays in its form only.
    }
  },
  drop(key: string): void {
    try {
      sessionStorage.removeItem(key);
    } catch {
      // Closed storage holds nothing either.
    }
  },
};
