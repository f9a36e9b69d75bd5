import type { ProcedureReport } from '../../../shared/contract/procedure';
import { Checkbox } from '../../ui/checkbox';
import { nameReport } from './regroup-words';

type ReportChoiceProps = {
  reports: readonly ProcedureReport[];
  timeZone: string;
  legend: string;
  chosen: readonly string[];
  onChange: (ids: string[]) => void;
};

/** Some of a procedure's reports. */
export const ReportChoice = ({ reports, timeZone, legend, chosen, onChange }: ReportChoiceProps) => (
  <fieldset className="flex max-h-60 flex-col gap-1 overflow-y-auto">
    <legend className="mb-1 text-sm font-semibold">{legend}</legend>
    {reports.map((report, index) => (
      <Checkbox
        key={report.id}
        label={nameReport(report, index, timeZone)}
        checked={chosen.includes(report.id)}
        onChange={({ target }) =>
          onChange(target.checked ? [...chosen, report.id] : chosen.filter((id) => id !== report.id))
        }
      />
    ))}
  </fieldset>
);
