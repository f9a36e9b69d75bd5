import type { Code, ImageReference } from '../../shared/contract/report-parts';
import { createTextReader, type CharacterSetNotice, type TextReader } from './character-set';
import { conceptNameOf } from './concepts';
import type { ConceptName } from './concepts.table-data';
import { asciiOf, bytesOf, firstItemOf, itemsOf, type DicomDataSet } from './read-dicom';

/** One NUM value: the decimal strings as written and the unit; an empty list if nothing was measured. */
export interface Measurement {
  text: string[];
  unit: Code | null;
  qualifier: Code | null;
}

/** A content item of the SR tree (PS3.3 C.17.3) with its value, whichever type it is of. */
export interface ContentItem {
  valueType: string;
  concept: Code | null;
  /** The concept among those the reader knows. */
  name: ConceptName | null;
  code: Code | null;
  text: string | null;
  measurement: Measurement | null;
  image: ImageReference | null;
  children: ContentItem[];
}

/** Text of one value type stands in its own attribute. */
const textTags = new Map([
  ['TEXT', 'x0040a160'],
  ['UIDREF', 'x0040a124'],
  ['DATETIME', 'x0040a120'],
  ['DATE', 'x0040a121'],
  ['TIME', 'x0040a122'],
  ['PNAME', 'x0040a123'],
]);

const none: ContentItem[] = [];

interface KnownCode {
  code: Code;
  name: ConceptName | null;
}

export class ContentTreeReader {
  /** A report repeats few codes many times: each is decoded once, with the meaning of its first appearance. */
  private readonly codes = new Map<string, KnownCode>();

  constructor(private readonly notice: CharacterSetNotice) {}

  /** The root container and everything below it. */
  read(dataSet: DicomDataSet): ContentItem {
    return this.readItem(dataSet, createTextReader(asciiOf(dataSet, 'x00080005'), this.notice));
  }

  private readItem(dataSet: DicomDataSet, outerText: TextReader): ContentItem {
    // An item may carry a character set of its own (PS3.3 C.12.1.1.2).
    const own = asciiOf(dataSet, 'x00080005');
    const text = own === null ? outerText : createTextReader(own, this.notice);
    const valueType = asciiOf(dataSet, 'x0040a040') ?? '';
    const concept = this.readCode(firstItemOf(dataSet, 'x0040a043'), text);
    const textTag = textTags.get(valueType);
    const children = itemsOf(dataSet, 'x0040a730');
    return {
      valueType,
      concept: concept?.code ?? null,
      name: concept?.name ?? null,
      code: valueType === 'CODE' ? this.codeOf(firstItemOf(dataSet, 'x0040a168'), text) : null,
      text: textTag === undefined ? null : readText(dataSet, textTag, text),
      measurement: valueType === 'NUM' ? this.readMeasurement(dataSet, text) : null,
      image: valueType === 'IMAGE' ? readImageReference(firstItemOf(dataSet, 'x00081199')) : null,
      children: children.length === 0 ? none : children.map((child) => this.readItem(child, text)),
    };
  }

  private codeOf(item: DicomDataSet | undefined, reader: TextReader): Code | null {
    return this.readCode(item, reader)?.code ?? null;
  }

  /** A code sequence item (PS3.3 table 8.8-1): Code Value, Long Code Value or URN Code Value. */
  private readCode(item: DicomDataSet | undefined, reader: TextReader): KnownCode | null {
    if (!item) return null;
    const value = asciiOf(item, 'x00080100') ?? asciiOf(item, 'x00080119') ?? asciiOf(item, 'x00080120');
    if (value === null) return null;
    const scheme = asciiOf(item, 'x00080102') ?? '';
    const key = `${scheme}|${value}`;
    let known = this.codes.get(key);
    if (!known) {
      const meaning = readText(item, 'x00080104', reader) ?? '';
      const code = { value: value.trim(), scheme: scheme.trim(), meaning };
      this.codes.set(key, (known = { code, name: conceptNameOf(code.scheme, code.value) }));
    }
    return known;
  }

  private readMeasurement(dataSet: DicomDataSet, reader: TextReader): Measurement {
    const measured = firstItemOf(dataSet, 'x0040a300');
    const text = measured ? asciiOf(measured, 'x0040a30a') : null;
    return {
      text: text === null ? [] : text.split('\\').map((part) => part.trim()),
      unit: measured ? this.codeOf(firstItemOf(measured, 'x004008ea'), reader) : null,
      qualifier: this.codeOf(firstItemOf(dataSet, 'x0040a301'), reader),
    };
  }
}

/** A Referenced SOP Sequence item of an IMAGE (PS3.3 C.17.3). */
function readImageReference(item: DicomDataSet | undefined): ImageReference | null {
  if (!item) return null;
  const frames = asciiOf(item, 'x00081160')?.split('\\') ?? [];
  return {
    sopClassUid: asciiOf(item, 'x00081150'),
    sopInstanceUid: asciiOf(item, 'x00081155'),
    frameNumbers: frames.map(Number).filter((frame) => Number.isInteger(frame) && frame > 0),
  };
}

/** Text of an attribute in the character set of its data set; null if absent or blank. */
export function readText(dataSet: DicomDataSet, tag: string, reader: TextReader): string | null {
  const bytes = bytesOf(dataSet, tag);
  return bytes === undefined || bytes.length === 0 ? null : reader.decode(bytes) || null;
}
