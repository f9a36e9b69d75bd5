import { codeItem, contentItem, dcm } from '../../server/dicom-writer/content-items';
import { sequenceElement, textElement, type DataSet } from '../../server/dicom-writer/data-element';
import type { WrittenCode } from '../../server/dicom-writer/written-parts';
import { headerElements } from '../../server/dicom-writer/header-elements';
import { caseContent } from './case-content';

const SR = '1.2.840.10008.5.1.4.1.1.88.';

function structuredReport(
  sample: number,
  sopClassUid: string,
  title: WrittenCode,
  items: DataSet[],
): DataSet {
  return [
    ...headerElements(caseContent(sample, { sopClassUid })),
    textElement(0x0040a040, 'CS', 'CONTAINER'),
    sequenceElement(0x0040a043, [codeItem(title)]),
    textElement(0x0040a050, 'CS', 'SEPARATE'),
    sequenceElement(0x0040a730, items),
  ];
}

const doseTitle = dcm('113701', 'X-Ray Radiation Dose Report');
const sct = (value: string, meaning: string): WrittenCode => ({ value, scheme: 'SCT', meaning });

function procedureReported(code: WrittenCode): DataSet {
  return contentItem.code('HAS CONCEPT MOD', dcm('121058', 'Procedure reported'), code);
}

/** TID 10011 with one acquisition. */
export function ctReport(sample: number): DataSet {
  return structuredReport(sample, `${SR}67`, doseTitle, [
    procedureReported(sct('77477000', 'Computed Tomography X-Ray')),
    contentItem.container(dcm('113811', 'CT Accumulated Dose Data'), [
      contentItem.number(dcm('113812', 'Total Number of Irradiation Events'), {
        text: '1',
        unit: '{events}',
      }),
      contentItem.number(dcm('113813', 'CT Dose Length Product Total'), { text: '412.5', unit: 'mGy.cm' }),
    ]),
    contentItem.container(dcm('113819', 'CT Acquisition'), [
      contentItem.text('CONTAINS', dcm('125203', 'Acquisition Protocol'), 'Abdomen'),
    ]),
  ]);
}

/** TID 10001 for mammography with its accumulated glandular dose. */
export function mammographyReport(sample: number): DataSet {
  return structuredReport(sample, `${SR}67`, doseTitle, [
    procedureReported(sct('71651007', 'Mammography')),
    contentItem.container(dcm('113702', 'Accumulated X-Ray Dose Data'), [
      contentItem.code('HAS CONCEPT MOD', dcm('113764', 'Acquisition Plane'), dcm('113622', 'Single Plane')),
      contentItem.number(dcm('111637', 'Accumulated Average Glandular Dose'), { text: '2.4', unit: 'mGy' }),
    ]),
  ]);
}

/** A measurement report (TID 1500 by its title). */
export function measurementReport(sample: number): DataSet {
  return structuredReport(sample, `${SR}33`, dcm('126000', 'Imaging Measurement Report'), [
    contentItem.text('CONTAINS', dcm('121106', 'Comment'), 'One lesion measured.'),
  ]);
}

/** A findings report. */
export function proseReport(sample: number): DataSet {
  const title = { value: '18748-4', scheme: 'LN', meaning: 'Diagnostic imaging report' };
  return structuredReport(sample, `${SR}11`, title, [
    contentItem.text('CONTAINS', dcm('121071', 'Finding'), 'No bleeding. Fluoroscopy 4.5 min.'),
  ]);
}

/** TID 10040 by SOP class and first container. */
export function enhancedReport(sample: number): DataSet {
  return structuredReport(sample, `${SR}76`, doseTitle, [
    contentItem.container(dcm('130500', 'Accumulated Dose Data'), [
      contentItem.text('CONTAINS', dcm('121106', 'Comment'), 'Totals'),
    ]),
  ]);
}

/** TID 10021 by SOP class and title. */
export function radiopharmaceuticalReport(sample: number): DataSet {
  return structuredReport(sample, `${SR}68`, dcm('113500', 'Radiopharmaceutical Radiation Dose Report'), [
    contentItem.text('CONTAINS', dcm('121106', 'Comment'), 'One administration'),
  ]);
}

/** An image of 8 × 8 grey pixels. */
export function secondaryCapture(sample: number): DataSet {
  const header = headerElements(caseContent(sample, { sopClassUid: '1.2.840.10008.5.1.4.1.1.7' }));
  return [
    ...header.filter((element) => element.tag < 0x00400000 && element.tag !== 0x00080060),
    textElement(0x00080060, 'CS', 'OT'),
    textElement(0x00080064, 'CS', 'WSD'),
    { tag: 0x00280002, vr: 'US', value: [1] },
    textElement(0x00280004, 'CS', 'MONOCHROME2'),
    { tag: 0x00280010, vr: 'US', value: [8] },
    { tag: 0x00280011, vr: 'US', value: [8] },
    { tag: 0x00280100, vr: 'US', value: [8] },
    { tag: 0x00280101, vr: 'US', value: [8] },
    { tag: 0x00280102, vr: 'US', value: [7] },
    { tag: 0x00280103, vr: 'US', value: [0] },
    { tag: 0x7fe00010, vr: 'OW', value: new Uint8Array(64).fill(128) },
  ];
}

/** A report with a comment of blanks that deflates to almost nothing; 80 MiB unless told. */
export function hugeReport(sample: number, byteCount = 80 * 1024 * 1024): DataSet {
  const comment = ' '.repeat(byteCount);
  return structuredReport(sample, `${SR}67`, doseTitle, [
    contentItem.text('CONTAINS', dcm('121106', 'Comment'), comment),
  ]);
}

/** Containers inside containers. */
export function deepReport(sample: number, depth: number): DataSet {
  let item = contentItem.text('CONTAINS', dcm('121106', 'Comment'), 'bottom');
  for (let level = 0; level < depth; level += 1) {
    item = contentItem.container(dcm('113702', 'Accumulated X-Ray Dose Data'), [item]);
  }
  return structuredReport(sample, `${SR}67`, doseTitle, [item]);
}

/** Anything but a report, in the class of one without pixels. */
function otherObject(sample: number, sopClassUid: string, modality: string): DataSet {
  const header = headerElements(caseContent(sample, { sopClassUid }));
  return [
    ...header.filter((element) => element.tag < 0x00400000 && element.tag !== 0x00080060),
    textElement(0x00080060, 'CS', modality),
  ];
}

/** Encapsulated PDF Storage with a few bytes in place of the document. */
export function encapsulatedDocument(sample: number): DataSet {
  return [
    ...otherObject(sample, '1.2.840.10008.5.1.4.1.1.104.1', 'DOC'),
    { tag: 0x00420011, vr: 'OB', value: new TextEncoder().encode('%PDF-1.7\n%%EOF\n') },
  ];
}

export function radiotherapyPlan(sample: number): DataSet {
  return otherObject(sample, '1.2.840.10008.5.1.4.1.1.481.5', 'RTPLAN');
}

/** TID 10040's first container under the class of TID 10001. */
export function enhancedInUsualClass(sample: number): DataSet {
  return structuredReport(sample, `${SR}67`, doseTitle, [
    procedureReported(dcm('113704', 'Projection X-Ray')),
    contentItem.container(dcm('130500', 'Accumulated Dose Data'), [
      contentItem.text('CONTAINS', dcm('121106', 'Comment'), 'Totals'),
    ]),
  ]);
}

export function reportWithPixels(sample: number): DataSet {
  return [
    ...structuredReport(sample, `${SR}67`, doseTitle, []),
    { tag: 0x7fe00010, vr: 'OW', value: new Uint8Array(64).fill(128) },
  ];
}

const CONTENT_SEQUENCE = Buffer.from([0x40, 0x00, 0x30, 0xa7, 0x53, 0x51, 0x00, 0x00]);

/** States another length for the root's Content Sequence (explicit little endian). */
export function withContentLength(file: Uint8Array, length: number): Uint8Array {
  const bytes = Buffer.from(file);
  bytes.writeUInt32LE(length, bytes.indexOf(CONTENT_SEQUENCE) + 8);
  return new Uint8Array(bytes);
}

/** Adds an empty item at the top level of the data set. */
export function withStrayItem(file: Uint8Array): Uint8Array {
  return new Uint8Array(Buffer.concat([file, Buffer.from([0xfe, 0xff, 0x00, 0xe0, 0, 0, 0, 0])]));
}

/** Shortens the stated length of the root's Content Sequence by its last item (explicit little endian). */
export function withShortContentLength(file: Uint8Array): Uint8Array {
  const bytes = Buffer.from(file);
  const start = bytes.indexOf(CONTENT_SEQUENCE);
  const end = start + 12 + bytes.readUInt32LE(start + 8);
  let position = start + 12;
  let lastItem = position;
  while (position < end) {
    lastItem = position;
    position += 8 + bytes.readUInt32LE(position + 4);
  }
  bytes.writeUInt32LE(lastItem - start - 12, start + 8);
  return new Uint8Array(bytes);
}
