import { sequenceElement, type DataElement, type DataSet } from '../../server/dicom-writer/data-element';

const CONTENT_SEQUENCE = 0x0040a730;
const CONCEPT_NAME_SEQUENCE = 0x0040a043;

const isSequence = (element: DataElement): element is DataElement & { value: DataSet[] } =>
  element.vr === 'SQ';

/** The code value of a content item's concept; empty where it has none. */
export function conceptOf(item: DataSet): string {
  const names = item.find((element) => element.tag === CONCEPT_NAME_SEQUENCE);
  const value = names && isSequence(names) ? names.value[0]?.[0]?.value : undefined;
  return typeof value === 'string' ? value : '';
}

/** A data set whose own content items are rewritten. */
export function changeItems(dataSet: DataSet, change: (items: DataSet[]) => DataSet[]): DataSet {
  return dataSet.map((element) =>
    element.tag === CONTENT_SEQUENCE && isSequence(element)
      ? sequenceElement(CONTENT_SEQUENCE, change(element.value))
      : element,
  );
}

/** Every content item at every depth, the innermost first; null takes one away. */
export function changeEveryItem(dataSet: DataSet, change: (item: DataSet) => DataSet | null): DataSet {
  return changeItems(dataSet, (items) =>
    items.map((item) => change(changeEveryItem(item, change))).filter((item) => item !== null),
  );
}

/** Every data set of the file, items of every sequence included. */
export function changeEveryDataSet(dataSet: DataSet, change: (dataSet: DataSet) => DataSet): DataSet {
  const inner = dataSet.map((element) =>
    isSequence(element)
      ? { ...element, value: element.value.map((item) => changeEveryDataSet(item, change)) }
      : element,
  );
  return change(inner);
}

/** Puts an element in place of the one of its tag, or adds it. */
export function withElement(dataSet: DataSet, added: DataElement): DataSet {
  return [...dataSet.filter((element) => element.tag !== added.tag), added];
}

/** Leaves out the element of a tag. */
export function withoutElement(dataSet: DataSet, tag: number): DataSet {
  return dataSet.filter((element) => element.tag !== tag);
}
