/** Minutes without a touch or a key after which a shared computer asks who is there. */
export const idleMinutes = 15;

const storageKey = 'leeward-last-input';
let isLocking = false;

/** While the screen locks, nothing may hold the page back. */
export const isScreenLocking = (): boolean => isLocking;
export const setScreenLocking = (value: boolean): void => {
  isLocking = value;
};

/** The last input in any tab of this browser; where storage is closed, in this tab. */
export function createInputClock(storage: Pick<Storage, 'getItem' | 'setItem'> | null, now: () => number) {
  let lastHere = now();
  return {
    touch() {
      lastHere = now();
      try {
        storage?.setItem(storageKey, String(lastHere));
      } catch {
        // Full or closed storage: this tab counts alone.
      }
    },
    isIdle() {
      let lastAnywhere = lastHere;
      try {
        lastAnywhere = Math.max(lastHere, Number(storage?.getItem(storageKey) ?? 0) || 0);
      } catch {
        // As above.
      }
      return now() - lastAnywhere >= idleMinutes * 60_000;
    },
  };
}
