import { contentItem, dcm } from './content-items';
import type { DataSet } from './data-element';
import type { DoseReportContent } from './dose-report-content';
import type { WrittenPerson, WrittenPersonObserver } from './written-parts';

const deviceRole = dcm('113876', 'Device Role in Procedure');

/** TID 1002 with TID 1004: the irradiating device as observer. */
export function deviceObserverItems({ equipment }: DoseReportContent): DataSet[] {
  const r = 'HAS OBS CONTEXT';
  const texts: [string, string, string | null | undefined][] = [
    ['121013', 'Device Observer Name', equipment.stationName],
    ['121014', 'Device Observer Manufacturer', equipment.manufacturer],
    ['121015', 'Device Observer Model Name', equipment.modelName],
    ['121016', 'Device Observer Serial Number', equipment.serialNumber],
    ['121017', 'Device Observer Physical Location During Observation', equipment.location],
  ];
  return [
    contentItem.code(r, dcm('121005', 'Observer Type'), dcm('121007', 'Device')),
    contentItem.uid(r, dcm('121012', 'Device Observer UID'), equipment.deviceUid),
    ...texts.flatMap(([code, meaning, text]) =>
      text ? [contentItem.text(r, dcm(code, meaning), text)] : [],
    ),
    ...(equipment.roles ?? []).map((role) => contentItem.code(r, deviceRole, role)),
  ];
}

/** TID 1002 with TID 1003: a person as observer. */
export function personObserverItems(observer: WrittenPersonObserver): DataSet[] {
  const r = 'HAS OBS CONTEXT';
  const { name, loginName, organization, organizationRole, role, roleIdentifier } = observer;
  const identifier = dcm('128775', "Identifier within Person Observer's Role");
  return [
    contentItem.code(r, dcm('121005', 'Observer Type'), dcm('121006', 'Person')),
    contentItem.personName(r, dcm('121008', 'Person Observer Name'), name),
    ...(loginName ? [contentItem.text(r, dcm('128774', "Person Observer's Login Name"), loginName)] : []),
    ...(organization
      ? [contentItem.text(r, dcm('121009', "Person Observer's Organization Name"), organization)]
      : []),
    ...(organizationRole
      ? [contentItem.code(r, dcm('121010', "Person Observer's Role in the Organization"), organizationRole)]
      : []),
    ...(role
      ? [
          contentItem.code(
            r,
            dcm('121011', "Person Observer's Role in this Procedure"),
            role,
            roleIdentifier ? [contentItem.text(r, identifier, roleIdentifier)] : [],
          ),
        ]
      : []),
  ];
}

/** TID 1021: the irradiating device of a plane. */
export function irradiatingDeviceItems({ equipment }: DoseReportContent): DataSet[] {
  const { manufacturer, modelName, serialNumber, deviceUid } = equipment;
  if (!manufacturer || !modelName || !serialNumber) return [];
  const r = 'HAS PROPERTIES';
  return [
    contentItem.code('CONTAINS', deviceRole, dcm('113859', 'Irradiating Device'), [
      contentItem.text(r, dcm('113878', 'Device Manufacturer'), manufacturer),
      contentItem.text(r, dcm('113879', 'Device Model Name'), modelName),
      contentItem.text(r, dcm('113880', 'Device Serial Number'), serialNumber),
      contentItem.uid(r, dcm('121012', 'Device Observer UID'), deviceUid),
    ]),
  ];
}

/** TID 1020: a person with the role in the procedure. */
export function personItem(person: WrittenPerson): DataSet {
  const r = 'HAS PROPERTIES';
  const children = [contentItem.code(r, dcm('113875', 'Person Role in Procedure'), person.role)];
  if (person.id) children.push(contentItem.text(r, dcm('113871', 'Person ID'), person.id));
  if (person.idIssuer) children.push(contentItem.text(r, dcm('113872', 'Person ID Issuer'), person.idIssuer));
  if (person.organizationRole) {
    const concept = dcm('113874', 'Person Role in Organization');
    children.push(contentItem.code(r, concept, person.organizationRole));
  }
  if (person.organization) {
    children.push(contentItem.text(r, dcm('113873', 'Organization Name'), person.organization));
  }
  return contentItem.personName('CONTAINS', dcm('113870', 'Person Name'), person.name, children);
}
