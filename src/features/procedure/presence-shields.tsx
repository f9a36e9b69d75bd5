import type { ReactNode } from 'react';
import { Checkbox } from '../../ui/checkbox';
import type { PresenceInput } from './presence-values';

const shields = [
  { field: 'hasGlasses', label: 'Lead glasses' },
  { field: 'hasCeilingScreen', label: 'Ceiling screen' },
  { field: 'hasTableSkirt', label: 'Table skirt' },
  { field: 'hasMobileScreen', label: 'Mobile screen' },
  { field: 'isTurnedAway', label: 'Back to the beam' },
  { field: 'isPresentDuringRotation', label: 'Stays during rotational runs' },
] as const;

const collarAnswers = [
  { value: 'yes', label: 'Collar worn' },
  { value: 'no', label: 'No collar' },
  { value: '', label: 'Collar not known' },
];

type PresenceShieldsProps = {
  presence: PresenceInput;
  onChange: (next: PresenceInput) => void;
  /** Stands at the end of the line. */
  children: ReactNode;
};

/** What stood between the person and the beam, as ticks in one line. */
export const PresenceShields = ({ presence, onChange, children }: PresenceShieldsProps) => (
  <div className="flex flex-wrap items-center gap-x-5 gap-y-1.5 text-sm">
    <select
      aria-label="Thyroid collar"
      value={presence.hasThyroidCollar === null ? '' : presence.hasThyroidCollar ? 'yes' : 'no'}
      onChange={({ target }) =>
        onChange({ ...presence, hasThyroidCollar: target.value === '' ? null : target.value === 'yes' })
      }
      className="min-h-7 rounded-edge border border-edge bg-surface px-2 text-ink hover:border-ink"
    >
      {collarAnswers.map(({ value, label }) => (
        <option key={value} value={value}>
          {label}
        </option>
      ))}
    </select>
    {shields.map(({ field, label }) => (
      <Checkbox
        key={field}
        label={label}
        checked={presence[field] ?? false}
        onChange={({ target }) => onChange({ ...presence, [field]: target.checked })}
      />
    ))}
    {children}
  </div>
);
