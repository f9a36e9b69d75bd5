import { useState } from 'react';
import { Button } from '../../ui/button';
import { photoPath } from './queries';

/** The picture, on request: it may show the patient's name, and each look is written down. */
export function EntryPhoto({ entryId }: { entryId: string }) {
  const [isAsked, setIsAsked] = useState(false);
  const [isBroken, setIsBroken] = useState(false);
  if (!isAsked)
    return (
      <Button isSmall className="self-start" onClick={() => setIsAsked(true)}>
        Show the picture of the dose screen
      </Button>
    );
  return isBroken ? (
    <p role="alert">The picture cannot be shown. Sign in again, or ask the administrator.</p>
  ) : (
    <figure className="flex flex-col gap-1">
      <img
        src={photoPath(entryId)}
        alt="The machine’s dose screen"
        className="max-h-[36rem] max-w-full border border-rule"
        onError={() => setIsBroken(true)}
      />
      <figcaption className="text-xs text-ink-2">Each look at the picture is recorded.</figcaption>
    </figure>
  );
}
