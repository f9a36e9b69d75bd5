import { Attachment } from '../attachments/attachment.entity';
import { AuditEntry } from '../audit/audit-entry.entity';
import { CheckSetting } from '../data-checks/check-setting.entity';
import { CheckSettlement } from '../data-checks/check-settlement.entity';
import { ArchivePart, ReceivedArchive } from '../dose-reports/archive.entity';
import { DoseReport } from '../dose-reports/dose-report.entity';
import { OriginalFile } from '../dose-reports/original-file.entity';
import { CalibrationFactor } from '../equipment/calibration-factor.entity';
import { Equipment } from '../equipment/equipment.entity';
import { Garment } from '../garments/garment.entity';
import { Hospital } from '../hospital/hospital.entity';
import { Level } from '../levels/level.entity';
import { ManualEntry } from '../manual-entries/manual-entry.entity';
import { Account } from '../people/account.entity';
import { Person } from '../people/person.entity';
import { SignInLink } from '../people/sign-in-link.entity';
import { IrradiationEvent } from '../procedures/irradiation-event.entity';
import { PatientIdentity } from '../procedures/patient-identity.entity';
import { Presence } from '../procedures/presence.entity';
import { Procedure } from '../procedures/procedure.entity';
import { ProcedureType } from '../procedure-types/procedure-type.entity';
import { Regrouping } from '../regrouping/regrouping.entity';
import { Room } from '../rooms/room.entity';
import { StaffEstimate } from '../staff-exposure/staff-estimate.entity';

export const entities = [
  Hospital,
  Person,
  Account,
  SignInLink,
  Room,
  Equipment,
  CalibrationFactor,
  ProcedureType,
  Garment,
  Level,
  OriginalFile,
  ReceivedArchive,
  ArchivePart,
  DoseReport,
  PatientIdentity,
  Procedure,
  IrradiationEvent,
  Presence,
  StaffEstimate,
  AuditEntry,
  Attachment,
  CheckSettlement,
  CheckSetting,
  Regrouping,
  ManualEntry,
];
