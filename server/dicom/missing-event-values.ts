import type { ReportEvent } from '../../shared/contract/report-event';
import type { WarningCollector } from './warning-collector';

/** What every event should have: without these, figures of the procedure or of the staff suffer. */
const always = [
  'irradiationEventUid',
  'startedAt',
  'kermaAreaProductGyCm2',
  'referenceAirKermaGy',
  'kvpMean',
  'tubeCurrentMa',
  'primaryAngleDeg',
  'secondaryAngleDeg',
  'sourceToDetectorMm',
  'sourceToIsocenterMm',
  'fieldAreaCm2',
] as const;

const whenPulsed = ['pulseRatePerS', 'pulseCount', 'pulseWidthMs'] as const;

/** A warning for each value that the event should have and that nothing was written for. */
export function warnOfMissingEventValues(event: ReportEvent, warnings: WarningCollector): void {
  const expected: (keyof ReportEvent)[] = [...always];
  if (event.type === 'fluoroscopy' && event.fluoroMode !== 'continuous') expected.push(...whenPulsed);
  if (event.type === 'rotational-acquisition') expected.push('primaryEndAngleDeg', 'secondaryEndAngleDeg');
  for (const field of expected) {
    if (event[field] === null && !(field in event.reported)) warnings.add('value-missing', field);
  }
  // An unknown code has a warning of its own.
  if (event.plane === null && event.planeCode === null) warnings.add('value-missing', 'plane');
  if (event.type === null && event.typeCode === null) warnings.add('value-missing', 'type');
  if (event.exposureTimeS === null && event.irradiationDurationS === null) {
    warnings.add('value-missing', 'exposureTimeS and irradiationDurationS');
  }
  if (event.filters.length === 0) warnings.add('value-missing', 'filters');
}
