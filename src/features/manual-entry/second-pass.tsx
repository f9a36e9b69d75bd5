import { useRef, useState, type FormEvent } from 'react';
import type { TypedQuantity } from '../../../shared/contract/manual-entry';
import { readTypedQuantity } from '../../../shared/read-typed-quantity';
import { isSameAmount } from '../../../shared/second-entry';
import { Button } from '../../ui/button';
import { Field } from '../../ui/field';
import { Section } from '../../ui/margin-note';
import { describeTyped, quantityNames, writeTyped } from './conversion-words';
import type { FigureField } from './entry-values';
import { FigureInputs } from './figure-inputs';

type SecondPassProps = {
  figures: readonly TypedQuantity[];
  isBusy: boolean;
  onDone: (confirmation: TypedQuantity[]) => void;
  onBack: () => void;
};

const namePlane = ({ plane }: TypedQuantity) => (plane === 'single' ? '' : `, plane ${plane}`);

/** What is wrong with the second typing of a figure; null where it says the same as the first. */
function compare(first: TypedQuantity, second: TypedQuantity): string | null {
  if (second.text.trim() === '') return 'Type it once more.';
  const { fault } = readTypedQuantity(second);
  if (fault) return fault.detail;
  return isSameAmount(first, second)
    ? null
    : `First ${writeTyped(first)}, now ${writeTyped(second)}. Look at the machine: type it again here, or go back and correct the first.`;
}

/** Large figures a second time, from the screen and not from the first typing, which is out of sight. */
export function SecondPass({ figures, isBusy, onDone, onBack }: SecondPassProps) {
  const [fields, setFields] = useState<FigureField[]>(() => figures.map(() => ({ text: '', unit: '' })));
  const [faults, setFaults] = useState<(string | null)[]>([]);
  const frame = useRef<HTMLFormElement>(null);
  const change = (place: number, part: Partial<FigureField>) =>
    setFields(fields.map((field, index) => (index === place ? { ...field, ...part } : field)));
  const again = figures.map((figure, index) => ({ ...figure, ...(fields[index] as FigureField) }));
  const submit = (event: FormEvent) => {
    event.preventDefault();
    const found = figures.map((figure, index) => compare(figure, again[index] as TypedQuantity));
    setFaults(found);
    if (found.every((fault) => fault === null)) onDone(again);
    else
      requestAnimationFrame(() =>
        frame.current?.querySelector<HTMLElement>('input[aria-invalid="true"]')?.focus(),
      );
  };
  return (
    <Section title="Once more, from the screen">
      <form ref={frame} noValidate onSubmit={submit} className="flex max-w-3xl flex-col gap-5">
        <p>
          Large figures start a patient’s follow-up, so they are typed twice. What you typed first is out of
          sight: read the machine’s screen or the picture again, number and unit.
        </p>
        {figures.map((figure, index) => {
          const typed = again[index] as TypedQuantity;
          return (
            <Field
              key={`${figure.quantity} ${figure.plane}`}
              label={`${quantityNames[figure.quantity]}${namePlane(figure)}`}
              hint={describeTyped(typed)}
              error={faults[index] ?? undefined}
              className="max-w-md"
            >
              {(attributes) => (
                <FigureInputs
                  quantity={figure.quantity}
                  control={attributes}
                  unit={typed.unit}
                  planeName={namePlane(figure)}
                  number={{
                    value: typed.text,
                    autoFocus: index === 0,
                    onChange: ({ target }) => change(index, { text: target.value }),
                  }}
                  select={{
                    value: typed.unit,
                    onChange: ({ target }) => change(index, { unit: target.value }),
                  }}
                />
              )}
            </Field>
          );
        })}
        <div className="flex flex-wrap gap-3 border-t border-rule pt-4">
          <Button type="submit" variant="primary" isBusy={isBusy} busyText="Storing …">
            Compare and store
          </Button>
          <Button onClick={onBack}>Back to the form</Button>
        </div>
      </form>
    </Section>
  );
}
