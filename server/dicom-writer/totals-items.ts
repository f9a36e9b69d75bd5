import { planeCodes, snomed } from './codes.table-data';
import { contentItem, dcm } from './content-items';
import type { DataSet } from './data-element';
import type { DoseReportContent, WrittenPlaneTotals } from './dose-report-content';
import type { WrittenCalibration } from './written-parts';
import { totalQuantities } from './event-quantities.table-data';
import { formatDateTime, formatQuantity } from './format-values';
import { quantityItems } from './quantity-items';
import { referencePointItems } from './reference-point-items';

function calibrationItem(calibration: WrittenCalibration, terminology: 'SCT' | 'SRT'): DataSet {
  const factor = formatQuantity(calibration.factor, '1', 1);
  const uncertainty = formatQuantity(calibration.uncertaintyPercent, '%', 1);
  return contentItem.container(dcm('122505', 'Calibration'), [
    contentItem.code(
      'HAS CONCEPT MOD',
      dcm('113794', 'Dose Measurement Device'),
      snomed.dosimeter[terminology],
    ),
    contentItem.dateTime(
      'CONTAINS',
      dcm('113723', 'Calibration DateTime'),
      formatDateTime(calibration.calibratedAt),
    ),
    contentItem.number(dcm('122322', 'Calibration Factor'), factor),
    contentItem.number(dcm('113763', 'Calibration Uncertainty'), uncertainty),
    contentItem.text(
      'CONTAINS',
      dcm('113724', 'Calibration Responsible Party'),
      calibration.responsibleParty,
    ),
    ...(calibration.protocol
      ? [contentItem.text('CONTAINS', dcm('113720', 'Calibration Protocol'), calibration.protocol)]
      : []),
  ]);
}

/** TID 10002 with 10004 or 10007: what one plane has accumulated. */
export function totalsItem(
  totals: WrittenPlaneTotals,
  content: DoseReportContent,
  device: DataSet[],
): DataSet {
  const plane = totals.plane ? planeCodes[totals.plane] : undefined;
  return contentItem.container(dcm('113702', 'Accumulated X-Ray Dose Data'), [
    ...(plane ? [contentItem.code('HAS CONCEPT MOD', dcm('113764', 'Acquisition Plane'), plane)] : []),
    ...(totals.calibrations ?? []).map((one) => calibrationItem(one, content.terminology ?? 'SCT')),
    ...(totals.detectorType
      ? [contentItem.code('CONTAINS', dcm('113947', 'Detector Type'), totals.detectorType)]
      : []),
    ...quantityItems(totals, totalQuantities),
    ...referencePointItems(totals.referencePointDefinition),
    ...device,
  ]);
}
