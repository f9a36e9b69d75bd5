import {
  found,
  isOutside,
  notChecked,
  passed,
  practice,
  write,
  writeBounds,
  type CheckRule,
} from './check-rule';

const units: CheckRule = {
  code: 'units',
  name: 'Known units',
  looksAt: 'Units of the report that nobody can read. Such a value counts as unknown and is never guessed.',
  remedy: 'Read the value off the machine’s screen, and type the total.',
  source: 'DICOM PS3.16, units by UCUM',
  severity: 'hard',
  owner: 'physicist',
  low: null,
  high: null,
  unit: null,
  check({ input }) {
    const unknown = [
      ...new Set(
        input.reports.flatMap((report) =>
          report.warnings.filter(({ code }) => code.startsWith('unit-')).map(({ detail }) => detail),
        ),
      ),
    ].toSorted();
    return unknown.length === 0
      ? passed('Every unit is known')
      : found(
          `A unit nobody can read: ${unknown.slice(0, 3).join('; ')}. The value counts as unknown`,
          unknown.join('; ').slice(0, 150),
        );
  },
};

const duplicateEvents: CheckRule = {
  code: 'duplicate-events',
  name: 'Events twice in a report',
  looksAt: 'Irradiation event UIDs that a report holds twice for one plane. Each counts once.',
  remedy: 'Nothing is counted twice here, but the reported total may be; compare it with the events.',
  source: 'DICOM PS3.16 TID 10003',
  severity: 'note',
  owner: 'physicist',
  low: null,
  high: null,
  unit: null,
  check({ input }) {
    if (input.reports.length === 0) return notChecked('No report.');
    const count = input.reports.flatMap((report) =>
      report.warnings.filter(({ code }) => code === 'event-duplicate'),
    ).length;
    return count > 0
      ? found('A report holds an irradiation event twice; each counts once', count)
      : passed('No event is in a report twice');
  },
};

const sharedEvents: CheckRule = {
  code: 'shared-events',
  name: 'Events of another procedure',
  looksAt: 'Irradiation events that another procedure of this hospital holds as well.',
  remedy: 'One of the two is under the wrong study or patient: compare them, then merge, move or withdraw.',
  source: 'DICOM PS3.16 TID 10003',
  severity: 'note',
  owner: 'physicist',
  low: null,
  high: null,
  unit: null,
  check({ context: { sharedEvents: shared } }) {
    return shared.count > 0
      ? found(
          `${shared.count} irradiation ${shared.count === 1 ? 'event is' : 'events are'} in ${shared.caseNumbers.join(', ')} as well`,
          ...shared.caseNumbers,
        )
      : passed('No other procedure holds its events');
  },
};

const referencePoint: CheckRule = {
  code: 'reference-point',
  name: 'Reference point',
  looksAt: 'Where the machine defines K a,r.',
  remedy: 'K a,r of such a machine is not comparable: enter a factor, or compare by P KA.',
  source: 'IEC 60601-2-43; DICOM PS3.16 CID 10025',
  severity: 'note',
  owner: 'physicist',
  low: null,
  high: null,
  unit: null,
  check({ input }) {
    const codes = input.reports.flatMap((report) =>
      report.reportedPlanes.flatMap((plane) => plane.referencePointDefinition?.code?.value ?? []),
    );
    if (codes.length === 0) return notChecked('The report does not say where K a,r is defined.');
    const other = codes.find((code) => code !== '113860');
    return other === undefined
      ? passed('Reference point 15 cm from the isocentre toward the source')
      : found('K a,r is defined at another point than 15 cm from the isocentre toward the source', other);
  },
};

const sizeRule = (
  rule: Pick<CheckRule, 'code' | 'name' | 'low' | 'high'> & { unit: string },
  field: 'patientWeightKg' | 'patientHeightM',
): CheckRule => ({
  ...rule,
  looksAt: `${rule.name} in the record. A missing one is a gap, not a fault.`,
  remedy: 'Correct it in the record.',
  source: practice,
  severity: 'note',
  owner: 'technologist',
  check({ input }, bounds) {
    const value = input.procedure[field];
    if (value === null || value === undefined) return notChecked(`${rule.name} is not known.`);
    return isOutside(value, bounds)
      ? found(`${rule.name} ${write(value)} ${rule.unit}: outside ${writeBounds(bounds)} ${rule.unit}`, value)
      : passed(`${rule.name} is plausible`);
  },
});

export const reportRules: CheckRule[] = [
  units,
  duplicateEvents,
  sharedEvents,
  referencePoint,
  sizeRule(
    { code: 'patient-weight', name: 'Patient’s weight', low: 2, high: 350, unit: 'kg' },
    'patientWeightKg',
  ),
  sizeRule(
    { code: 'patient-height', name: 'Patient’s height', low: 0.3, high: 2.5, unit: 'm' },
    'patientHeightM',
  ),
];
