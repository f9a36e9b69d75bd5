import type { ReactNode } from 'react';
import { MISSING, THIN_SPACE } from '../../shared/units';
import { DrawnSign } from './drawn-signs';
import { VisuallyHidden } from './visually-hidden';

type QuantityProps = {
  /** Already formatted by shared/units. */
  value: string;
  unit?: ReactNode;
  /** A dagger: the physicist's factor is in it. */
  isCorrected?: boolean;
  /** The sum over two planes bounds the value from above. */
  isUpperBound?: boolean;
  /** Printed small behind the value: "140–830". */
  interval?: string | null;
  /** Typed by a person, because the system wrote no report. */
  isManual?: boolean;
  /** What a missing value is read out as. */
  missingText?: string;
};

/** A figure with its unit beside it. Missing is a dash that is read out as words, never 0. */
export function Quantity({
  value,
  unit,
  isCorrected,
  isUpperBound,
  interval,
  isManual,
  missingText = 'not reported',
}: QuantityProps) {
  if (value === MISSING) {
    return (
      <span className="text-ink-2">
        <span aria-hidden="true">{MISSING}</span>
        <VisuallyHidden>{missingText}</VisuallyHidden>
      </span>
    );
  }
  return (
    <span className="whitespace-nowrap">
      {isUpperBound && <DrawnSign name="at most" />}
      {value}
      {unit && (
        <>
          {THIN_SPACE}
          <span className="text-[0.9em]">{unit}</span>
        </>
      )}
      {isCorrected && (
        <>
          <span aria-hidden="true">{THIN_SPACE}†</span>
          <VisuallyHidden> corrected</VisuallyHidden>
        </>
      )}
      {isManual && (
        <>
          {' '}
          <DrawnSign name="entered by hand" />
        </>
      )}
      {interval && (
        <span className="ml-1 text-[0.88em] text-ink-2">
          (<VisuallyHidden>interval </VisuallyHidden>
          {interval})
        </span>
      )}
    </span>
  );
}
