import { Chevron } from './chevron';
import type { Choice } from './select-field';

type SentenceSelectProps = {
  /** What is chosen here: "procedure type". */
  label: string;
  value: string;
  choices: readonly Choice[];
  onChange: (value: string) => void;
};

/**
 * An emphasised part of the filter sentence: the words are printed so that they wrap like text, and a
 * native select lies over them, as wide as they are.
 */
export function SentenceSelect({ label, value, choices, onChange }: SentenceSelectProps) {
  const chosen = choices.find((choice) => choice.value === value);
  return (
    <span className="relative inline-block max-w-full border-b-2 border-lee align-baseline leading-7 font-semibold text-lee has-[select:focus-visible]:outline-2 has-[select:focus-visible]:outline-offset-2 has-[select:focus-visible]:outline-lee has-[select:hover]:border-ink">
      <span aria-hidden="true">
        {chosen?.label ?? value}
        <Chevron className="ml-1.5 align-middle" />
      </span>
      <select
        aria-label={label}
        value={value}
        onChange={(event) => onChange(event.target.value)}
        className="absolute inset-0 w-full appearance-none bg-surface text-base text-ink opacity-0"
      >
        {chosen === undefined && <option value={value}>{value}</option>}
        {choices.map((choice) => (
          <option key={choice.value} value={choice.value} disabled={choice.isDisabled}>
            {choice.label}
          </option>
        ))}
      </select>
    </span>
  );
}
