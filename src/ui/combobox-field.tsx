import { useEffect, useRef } from 'react';
import { joinClassNames } from '../lib/class-names';
import { Chevron } from './chevron';
import { controlLook, Field, type FieldFrameProps } from './field';
import { useCombobox, type ComboboxChoice } from './use-combobox';

type ComboboxFieldProps = FieldFrameProps & {
  choices: readonly ComboboxChoice[];
  value: string | null;
  onChange: (value: string | null) => void;
  onBlur?: () => void;
  name?: string;
  placeholder?: string;
  isDisabled?: boolean;
};

/** One of many: type a few letters, choose with arrows and Enter, Escape leaves everything as it was. */
export function ComboboxField({
  label,
  hint,
  error,
  isOptional,
  origin,
  className,
  choices,
  value,
  onChange,
  onBlur,
  name,
  placeholder = 'Type to search',
  isDisabled,
}: ComboboxFieldProps) {
  const box = useCombobox({ choices, value, onChange });
  const list = useRef<HTMLUListElement>(null);
  useEffect(() => {
    list.current?.querySelector('[aria-selected="true"]')?.scrollIntoView({ block: 'nearest' });
  }, [box.active, box.isOpen]);

  return (
    <Field {...{ label, hint, error, isOptional, origin, className }}>
      {(control) => (
        <div className="relative">
          <input
            {...control}
            name={name}
            type="text"
            role="combobox"
            autoComplete="off"
            spellCheck={false}
            disabled={isDisabled}
            placeholder={placeholder}
            className={joinClassNames(controlLook, 'pr-8')}
            aria-autocomplete="list"
            aria-expanded={box.isOpen}
            aria-controls={`${control.id}-list`}
            aria-activedescendant={
              box.isOpen && box.shown.length > 0 ? `${control.id}-${box.active}` : undefined
            }
            value={box.text}
            onChange={(event) => box.type(event.target.value)}
            onClick={() => !box.isOpen && box.open()}
            onKeyDown={box.pressKey}
            onBlur={() => {
              box.close();
              onBlur?.();
            }}
          />
          <Chevron className="pointer-events-none absolute right-3 top-1/2 -translate-y-1/2 text-ink-2" />
          <ul
            ref={list}
            id={`${control.id}-list`}
            role="listbox"
            aria-label={typeof label === 'string' ? label : 'Choices'}
            hidden={!box.isOpen}
            className="absolute inset-x-0 top-full z-30 mt-1 max-h-72 overflow-y-auto border border-edge bg-surface py-1 shadow-lg"
          >
            {/* Closed, there is nothing to build: a form may hold twenty such fields. */}
            {box.isOpen &&
              box.shown.map((choice, index) => (
                <li
                  key={choice.value}
                  id={`${control.id}-${index}`}
                  role="option"
                  aria-selected={index === box.active}
                  // The field keeps the focus; a blur would close the list before the click.
                  onMouseDown={(event) => event.preventDefault()}
                  onClick={() => box.choose(choice)}
                  className="min-h-8 border-l-3 border-transparent px-3 py-1 hover:bg-paper aria-selected:border-lee aria-selected:bg-paper"
                >
                  {choice.label}
                  {choice.detail && <span className="ml-2 text-sm text-ink-2">{choice.detail}</span>}
                </li>
              ))}
            {box.shown.length === 0 && (
              <li role="option" aria-selected={false} aria-disabled="true" className="px-3 py-1 text-ink-2">
                Nobody and nothing fits these letters.
              </li>
            )}
          </ul>
        </div>
      )}
    </Field>
  );
}
