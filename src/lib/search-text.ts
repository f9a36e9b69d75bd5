import { useState, type ChangeEvent, type KeyboardEvent } from 'react';

/**
 * Letters that narrow a list at once. They go into the address on Enter and on leaving the field, as one step
 * of the history: a round through the address for each letter would lose some of them.
 */
export function useSearchText(inAddress: string, writeToAddress: (text: string) => void) {
  const [typed, setTyped] = useState(inAddress);
  const [seen, setSeen] = useState(inAddress);
  // Back and forward change the address: the field follows.
  if (inAddress !== seen) {
    setSeen(inAddress);
    setTyped(inAddress);
  }
  const settle = () => {
    if (typed !== inAddress) writeToAddress(typed);
  };
  return {
    text: typed.trim().toLowerCase(),
    input: {
      value: typed,
      onChange: (event: ChangeEvent<HTMLInputElement>) => setTyped(event.target.value),
      onBlur: settle,
      onKeyDown: (event: KeyboardEvent) => {
        if (event.key === 'Enter') settle();
      },
    },
  };
}
