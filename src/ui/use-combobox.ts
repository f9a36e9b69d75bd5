import { useMemo, useState, type KeyboardEvent } from 'react';

export type ComboboxChoice = {
  value: string;
  label: string;
  /** A second line in the list, searched too: job, code. */
  detail?: string;
};

const fold = (text: string): string =>
  text
    .normalize('NFD')
    .replace(/\p{Diacritic}/gu, '')
    .toLowerCase();

/** Choices whose words contain every typed word; those that start with the text come first. */
export function findChoices(choices: readonly ComboboxChoice[], typed: string): ComboboxChoice[] {
  const words = fold(typed).split(/\s+/).filter(Boolean);
  if (words.length === 0) return [...choices];
  const first = words[0] ?? '';
  return choices
    .filter((choice) => {
      const text = fold(`${choice.label} ${choice.detail ?? ''}`);
      return words.every((word) => text.includes(word));
    })
    .sort(
      (one, other) => Number(fold(other.label).startsWith(first)) - Number(fold(one.label).startsWith(first)),
    );
}

type ComboboxInput = {
  choices: readonly ComboboxChoice[];
  value: string | null;
  onChange: (value: string | null) => void;
};

/** State and keys of a combobox with a list that filters while one types (WAI-ARIA authoring practices). */
export function useCombobox({ choices, value, onChange }: ComboboxInput) {
  const chosenLabel = choices.find((choice) => choice.value === value)?.label ?? '';
  const [typed, setTyped] = useState<string | null>(null);
  const [isOpen, setIsOpen] = useState(false);
  const [active, setActive] = useState(0);
  const shown = useMemo(() => findChoices(choices, typed ?? ''), [choices, typed]);

  const open = () => {
    setIsOpen(true);
    setActive(
      Math.max(
        0,
        choices.findIndex((choice) => choice.value === value),
      ),
    );
  };
  const close = () => {
    setIsOpen(false);
    setTyped(null);
  };
  const choose = (choice: ComboboxChoice | undefined) => {
    if (choice) onChange(choice.value);
    close();
  };
  const type = (text: string) => {
    setTyped(text);
    setActive(0);
    setIsOpen(true);
    if (text === '') onChange(null);
  };
  const step = (by: number) => {
    if (!isOpen) open();
    else setActive((current) => Math.min(Math.max(current + by, 0), shown.length - 1));
  };
  const pressKey = (event: KeyboardEvent) => {
    const deeds: Record<string, (() => void) | undefined> = {
      ArrowDown: () => step(1),
      ArrowUp: () => step(-1),
      PageDown: isOpen ? () => step(8) : undefined,
      PageUp: isOpen ? () => step(-8) : undefined,
      Enter: isOpen ? () => choose(shown[active]) : undefined,
      Escape: isOpen ? close : undefined,
    };
    const deed = deeds[event.key];
    if (!deed) return;
    event.preventDefault();
    event.stopPropagation();
    deed();
  };
  return { text: typed ?? chosenLabel, shown, isOpen, active, open, close, choose, type, pressKey };
}
