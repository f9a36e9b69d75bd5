import type { Report } from '../../shared/contract/report';
import { deviceTypeOf } from './coded-values';

/**
 * Fluoroscopy or radiography. An event or time of fluoroscopy decides over the declared device type (combined units
 * declare either); without both, stationary acquisitions alone without angles of a C-arm are radiography.
 */
export function classifyDevice(
  report: Pick<Report, 'acquisitionDeviceType' | 'planes' | 'events'>,
): Report['deviceClass'] {
  const { events, planes } = report;
  const hasFluoroscopy =
    events.some((event) => event.type === 'fluoroscopy' || event.fluoroMode !== null) ||
    planes.some((plane) => (plane.fluoroscopyTimeS ?? 0) > 0);
  if (hasFluoroscopy) return 'fluoroscopy';
  const declared = deviceTypeOf(report.acquisitionDeviceType);
  if (declared !== null) return declared === 'fluoroscopy-guided' ? 'fluoroscopy' : 'radiography';
  const isStill =
    events.length > 0 &&
    events.every((event) => event.type === 'stationary-acquisition' && event.primaryAngleDeg === null);
  return isStill ? 'radiography' : 'fluoroscopy';
}
