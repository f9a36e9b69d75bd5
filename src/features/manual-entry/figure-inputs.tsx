import type { ComponentProps } from 'react';
import type { TypedQuantityName } from '../../../shared/contract/manual-entry';
import { minutesAndSeconds, typedUnits } from '../../../shared/typed-units';
import { joinClassNames } from '../../lib/class-names';
import { Chevron } from '../../ui/chevron';
import { controlLook, type ControlAttributes } from '../../ui/field';
import { quantityNames } from './conversion-words';

type FigureInputsProps = {
  quantity: TypedQuantityName;
  control: ControlAttributes;
  unit: string;
  number: ComponentProps<'input'>;
  select: ComponentProps<'select'>;
  /** Goes to the unit's name where several planes have the same. */
  planeName: string;
};

/** A number and, beside it, the unit that the machine shows. Nothing is preset: nobody overlooks a unit they chose. */
export const FigureInputs = ({ quantity, control, unit, number, select, planeName }: FigureInputsProps) => (
  <span className="flex items-center gap-2">
    <input
      type="text"
      // A numeric keypad has no colon.
      inputMode={unit === minutesAndSeconds ? 'text' : 'decimal'}
      autoComplete="off"
      maxLength={20}
      {...number}
      {...control}
      className={joinClassNames(controlLook, 'min-w-0 flex-1 text-right')}
    />
    {quantity === 'frame-count' ? (
      <span className="w-30 flex-none text-ink-2">frames</span>
    ) : (
      <span className="relative w-30 flex-none">
        <select
          {...select}
          aria-label={`Unit of ${quantityNames[quantity].toLowerCase()}${planeName}`}
          aria-invalid={control['aria-invalid']}
          className={joinClassNames(controlLook, 'appearance-none pr-7')}
        >
          <option value="">unit …</option>
          {typedUnits[quantity].map((one) => (
            <option key={one.unit} value={one.unit}>
              {one.sign}
            </option>
          ))}
        </select>
        <Chevron className="pointer-events-none absolute top-1/2 right-2.5 -translate-y-1/2 text-ink-2" />
      </span>
    )}
  </span>
);
