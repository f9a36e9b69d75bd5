import type { Authenticator } from './http/passport';
import { attachmentRoutes } from './attachments/attachment.routes';
import { dataCheckRoutes } from './data-checks/data-check.routes';
import { decideReportRoutes } from './dose-reports/decide-report.routes';
import { doseReportRoutes } from './dose-reports/dose-report.routes';
import { equipmentRoutes } from './equipment/equipment.routes';
import { garmentRoutes } from './garments/garment.routes';
import { healthRoutes } from './health/health.routes';
import type { Route } from './http/route';
import type { SignInThrottle } from './http/sign-in-throttle';
import { manualEntryRoutes } from './manual-entries/manual-entry.routes';
import { personRoutes } from './people/person.routes';
import { procedureRoutes } from './procedures/procedure.routes';
import { procedureTypeRoutes } from './procedure-types/procedure-type.routes';
import { regroupingRoutes } from './regrouping/regrouping.routes';
import { roomRoutes } from './rooms/room.routes';
import { sessionRoutes } from './session/session.routes';
import { exposureRoutes } from './staff-exposure/exposure.routes';

type Parts = { authenticator: Authenticator; throttle: SignInThrottle; version: string };

/** Every endpoint of the API, below /api. */
export const allRoutes = ({ authenticator, throttle, version }: Parts): Route[] => [
  ...healthRoutes(version),
  ...sessionRoutes(authenticator, throttle),
  ...personRoutes,
  ...doseReportRoutes,
  ...decideReportRoutes,
  ...procedureRoutes,
  ...regroupingRoutes,
  ...dataCheckRoutes,
  ...attachmentRoutes,
  ...manualEntryRoutes,
  ...roomRoutes,
  ...equipmentRoutes,
  ...procedureTypeRoutes,
  ...garmentRoutes,
  ...exposureRoutes,
];
