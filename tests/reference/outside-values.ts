import type { Report } from '../../shared/contract/report';
import type { ReportEvent } from '../../shared/contract/report-event';
import type { Code, ImageReference } from '../../shared/contract/report-parts';

/** A value as pydicom shows it: text, a code's value, scheme and meaning, or an image's class, instance and frames. */
export type OutsideValue = string | (string | number[])[];
export type OutsideValues = Record<string, OutsideValue[]>;

const code = (one: Code | null) => (one === null ? [] : [[one.value, one.scheme]]);
const codes = (list: Code[]) => list.flatMap(code);
const text = (one: string | null) => (one === null ? [] : [one]);
const images = (list: ImageReference[]) =>
  list.map((one) => [one.sopClassUid ?? '', one.sopInstanceUid ?? '', one.frameNumbers]);

/** Concept (or concept>concept below it) → what the reader has for it; codes of PS3.16 stated apart from its table. */
export function ownEventValues(event: ReportEvent): Record<string, OutsideValue[]> {
  return {
    '113769': text(event.irradiationEventUid),
    '113764': code(event.planeCode),
    '113721': code(event.typeCode),
    '125203': text(event.protocol),
    '121106': text(event.comment),
    '113605': text(event.label),
    '113605>113606': code(event.labelType),
    '91723000|T-D0005': code(event.anatomy),
    '91723000>272741003|91723000>G-C171|T-D0005>272741003|T-D0005>G-C171': code(event.laterality),
    '111031': code(event.imageView),
    '111031>111032': codes(event.imageViewModifiers),
    '113946': code(event.projectionName),
    '113745': code(event.patientTableRelationship),
    '113743': code(event.patientOrientation),
    '113743>113744': code(event.patientOrientationModifier),
    '123014': code(event.targetRegion),
    '113780': [
      ...code(event.referencePointDefinition?.code ?? null),
      ...text(event.referencePointDefinition?.text ?? null),
    ],
    '113732': code(event.fluoroModeCode),
    '113768>121401': code(event.pulseCountDerivation),
    '123011': event.contrastAgents.flatMap((agent) => [...code(agent.code), ...text(agent.text)]),
    '113795': images(event.acquiredImages),
    '111632': code(event.anodeMaterial),
    '111635': codes(event.grids),
    '113956': code(event.mechanicalConfiguration),
    '113870': event.persons.flatMap((person) => text(person.name)),
    '113870>113875': event.persons.flatMap((person) => code(person.role)),
    '113876>113880': event.devices.flatMap((device) => text(device.serialNumber)),
  };
}

export function ownRootValues(report: Report): Record<string, OutsideValue[]> {
  const { observers, persons, scopeOfAccumulation: scope } = report;
  return {
    '121049': code(report.language),
    '121049>121046': code(report.country),
    '121058': code(report.procedureReported),
    '121058>363703001|121058>G-C0E8': code(report.intent),
    '122142': code(report.acquisitionDeviceType),
    '113705': code(scope?.code ?? null),
    '113705>110180|113705>112002|113705>121126|113705>113853': text(scope?.uid ?? null),
    '113854': codes(report.sourcesOfInformation),
    '121106': text(report.comment),
    '121342': images(report.doseImages),
    '121012': observers.flatMap((one) => text(one.uid)),
    '121013': observers.flatMap((one) => (one.type === 'device' ? text(one.name) : [])),
    '121014': observers.flatMap((one) => text(one.manufacturer)),
    '121015': observers.flatMap((one) => text(one.modelName)),
    '121016': observers.flatMap((one) => text(one.serialNumber)),
    '121017': observers.flatMap((one) => text(one.location)),
    '113876': observers.flatMap((one) => codes(one.deviceRoles)),
    '121008': observers.flatMap((one) => (one.type === 'person' ? text(one.name) : [])),
    '128774': observers.flatMap((one) => text(one.loginName)),
    '121009': observers.flatMap((one) => text(one.organization)),
    '121010': observers.flatMap((one) => code(one.organizationRole)),
    '121011': observers.flatMap((one) => code(one.role)),
    '121011>128775': observers.flatMap((one) => text(one.roleIdentifier)),
    '113870': persons.flatMap((person) => text(person.name)),
    '113870>113875': persons.flatMap((person) => code(person.role)),
    '113870>113871': persons.flatMap((person) => text(person.id)),
    '113870>113872': persons.flatMap((person) => text(person.idIssuer)),
    '113870>113873': persons.flatMap((person) => text(person.organization)),
    '113870>113874': persons.flatMap((person) => code(person.organizationRole)),
  };
}

/**
 * The outside values for the same keys: meanings are left out, since the reader keeps the first of a code's meanings,
 * and so are NUL and the blanks that pad a value.
 */
export function outsideValuesOf(outside: OutsideValues, keys: string[]): Record<string, OutsideValue[]> {
  const bare = (value: OutsideValue): OutsideValue[] => {
    if (typeof value === 'string') return [value.replaceAll('\0', '').trimEnd()];
    return [typeof value[2] === 'string' ? value.slice(0, 2) : value];
  };
  return Object.fromEntries(
    keys.map((key) => [key, key.split('|').flatMap((one) => (outside[one] ?? []).flatMap(bare))]),
  );
}
