import type { DeviceParticipant, Observer, PersonParticipant } from '../../shared/contract/report-parts';
import { observerTypeOf } from './coded-values';
import type { ConceptName } from './concepts.table-data';
import type { ContentItem } from './content-tree';
import { ItemIndex } from './item-index';

/** TID 1020: one entry for each Person Name item. */
export function readPersons(items: ContentItem[] | undefined): PersonParticipant[] {
  return (items ?? []).map((item) => {
    const properties = new ItemIndex(item);
    return {
      name: item.text,
      role: properties.code('personRole'),
      id: properties.text('personId'),
      idIssuer: properties.text('personIdIssuer'),
      organization: properties.text('organizationName'),
      organizationRole: properties.code('organizationRole'),
    };
  });
}

/** TID 1021: one entry for each Device Role in Procedure item. */
export function readDevices(items: ContentItem[] | undefined): DeviceParticipant[] {
  return (items ?? []).flatMap((item) => {
    if (item.children.length === 0) return [];
    const properties = new ItemIndex(item);
    return [
      {
        role: item.code,
        name: properties.text('deviceName'),
        manufacturer: properties.text('deviceManufacturer'),
        modelName: properties.text('deviceModelName'),
        serialNumber: properties.text('deviceSerialNumber'),
        observerUid: properties.text('deviceObserverUid'),
      },
    ];
  });
}

function emptyObserver(): Observer {
  return {
    type: null,
    uid: null,
    name: null,
    manufacturer: null,
    modelName: null,
    serialNumber: null,
    organization: null,
    role: null,
    location: null,
    deviceRoles: [],
    loginName: null,
    organizationRole: null,
    roleIdentifier: null,
  };
}

const observerTexts = new Map<
  ConceptName | null,
  'name' | 'manufacturer' | 'modelName' | 'serialNumber' | 'organization' | 'location' | 'loginName'
>([
  ['deviceObserverLocation', 'location'],
  ['personObserverLogin', 'loginName'],
  ['deviceObserverName', 'name'],
  ['deviceObserverManufacturer', 'manufacturer'],
  ['deviceObserverModelName', 'modelName'],
  ['deviceObserverSerialNumber', 'serialNumber'],
  ['personObserverOrganization', 'organization'],
]);

function readRole(item: ContentItem, observer: Observer): void {
  observer.role = item.code;
  observer.roleIdentifier = new ItemIndex(item).text('personObserverIdentifier');
}

/** TID 1002: an observer starts with its type, or with its name or UID where the type is left out. */
export function readObservers(root: ContentItem): Observer[] {
  const observers: Observer[] = [];
  const start = () => {
    const observer = emptyObserver();
    observers.push(observer);
    return observer;
  };
  const current = () => observers.at(-1) ?? start();
  const unnamed = () => {
    const last = observers.at(-1);
    return last && last.name === null && last.uid === null ? last : start();
  };
  for (const item of root.children) {
    const textField = observerTexts.get(item.name);
    if (textField) current()[textField] = item.text;
    if (item.name === 'observerType') start().type = observerTypeOf(item.code);
    if (item.name === 'personObserverName') Object.assign(unnamed(), { name: item.text, type: 'person' });
    if (item.name === 'deviceObserverUid') Object.assign(unnamed(), { uid: item.text, type: 'device' });
    if (item.name === 'personObserverRole') readRole(item, current());
    if (item.name === 'personObserverOrganizationRole') current().organizationRole = item.code;
    // With children, the item is a device participant (TID 1021) and no observer's role.
    if (item.name === 'deviceRole' && item.code && item.children.length === 0)
      current().deviceRoles.push(item.code);
  }
  return observers;
}
