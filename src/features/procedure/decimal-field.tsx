import { useState } from 'react';
import { parseDecimal } from '../../lib/parse-decimal';
import type { FieldFrameProps } from '../../ui/field';
import { NumberField } from '../../ui/number-field';

type DecimalFieldProps = FieldFrameProps & {
  unit: string;
  value: number | null;
  onChange: (value: number | null) => void;
};

const write = (value: number | null): string =>
  value === null || Number.isNaN(value) ? '' : String(Number(value.toFixed(3)));

/** A number that is kept in another unit than it is typed in; half-typed text stays as it is typed. */
export function DecimalField({ value, onChange, ...field }: DecimalFieldProps) {
  const [typed, setTyped] = useState<string | null>(null);
  return (
    <NumberField
      {...field}
      value={typed ?? write(value)}
      onChange={({ target }) => {
        setTyped(target.value);
        onChange(parseDecimal(target.value));
      }}
      onBlur={() => !Number.isNaN(value) && setTyped(null)}
    />
  );
}
