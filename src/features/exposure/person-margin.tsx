import type {
  ExposedPerson,
  ExposureMonths,
  ExposureQuantity,
} from '../../../shared/contract/staff-exposure';
import { jobNames } from '../../../shared/contract/person';
import { MarginNote } from '../../ui/margin-note';
import { SelectField } from '../../ui/select-field';
import { dropEmptyEnd, sumFigures, writeMsv } from './month-figures';
import { MonthsChart } from './months-chart';

type PersonMarginProps = {
  months: ExposureMonths;
  quantity: ExposureQuantity;
  /** Empty where people are not named. */
  people: readonly ExposedPerson[];
  onChoose: (id: string) => void;
};

/** One person by month, or all staff together. */
export function PersonMargin({ months, quantity, people, onChoose }: PersonMarginProps) {
  const shown = dropEmptyEnd(months.items);
  const of = months.person?.name ?? 'all staff together';
  const sum = sumFigures(shown, quantity);
  return (
    <MarginNote title={months.person ? 'One person by month' : 'All staff by month'}>
      {people.length > 1 && (
        <SelectField
          label="Person"
          value={months.person?.id ?? ''}
          emptyLabel="All staff together"
          choices={people.map(({ id, name, job }) => ({ value: id, label: `${name}, ${jobNames[job]}` }))}
          onChange={(event) => onChoose(event.target.value)}
        />
      )}
      {shown.some((month) => month[quantity] !== null) ? (
        <MonthsChart months={shown} quantity={quantity} of={of} height={180} />
      ) : (
        <p className="text-sm text-ink-2">
          {months.isWithheld
            ? 'Fewer than five people stand behind these months: without names they are not shown.'
            : 'No month of this period has an estimate.'}
        </p>
      )}
      {sum && months.person && (
        <p className="text-sm text-ink-2">
          Together {writeMsv(sum)} in {shown.length} months.
        </p>
      )}
    </MarginNote>
  );
}
