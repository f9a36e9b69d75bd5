import { contentItem, dcm } from '../../server/dicom-writer/content-items';
import { textElement, type DataSet } from '../../server/dicom-writer/data-element';
import { caseContent, fluoroscopyEvent, smallCase } from './case-content';
import {
  changeEveryDataSet,
  changeEveryItem,
  changeItems,
  conceptOf,
  withElement,
  withoutElement,
} from './edit-content';
import { readable, withEvents } from './make-readable';
import type { Sample } from './sample';

const isOf = (code: string) => (item: DataSet) => conceptOf(item) === code;
const own = (value: string, meaning: string) => ({ value, scheme: '99QUILLON', meaning });

/** Numbers under private concepts whose code values are those of known ones. */
const foreignTotals = [
  contentItem.number(own('113722', 'Own total'), { text: '99', unit: 'Gy.m2' }),
  contentItem.number(own('113725', 'Own kerma'), { text: '99', unit: 'Gy' }),
];

/** The tree as the template allows it and as machines write it (PS3.16 TID 10001, PS3.3 C.17.3). */
export function structureSamples(): Sample[] {
  return [
    readable('84-totals-last', 'Accumulated values after the events.', caseContent(84), {
      change: (dataSet) =>
        changeItems(dataSet, (items) => [
          ...items.filter((item) => !isOf('113702')(item)),
          ...items.filter(isOf('113702')),
        ]),
      isValid: false,
    }),
    readable(
      '85-one-container-deeper',
      'Events inside a container of their own, and the values of an event inside a group.',
      caseContent(85),
      {
        isValid: false,
        change: (dataSet) =>
          changeItems(
            changeEveryItem(dataSet, (item) =>
              isOf('113706')(item)
                ? changeItems(item, (items) => [
                    ...items.slice(0, 3),
                    contentItem.container(own('G1', 'Exposure data'), items.slice(3)),
                  ])
                : item,
            ),
            (items) => [
              ...items.filter((item) => !isOf('113706')(item)),
              contentItem.container(dcm('121111', 'Summary'), items.filter(isOf('113706'))),
            ],
          ),
      },
    ),
    readable(
      '86-private-items',
      'Private items with the code values of known ones, at the root, in totals and in events.',
      smallCase(86),
      {
        isValid: false,
        change: (dataSet) =>
          changeItems(
            changeEveryItem(dataSet, (item) =>
              isOf('113706')(item) || isOf('113702')(item)
                ? changeItems(item, (items) => [...foreignTotals, ...items])
                : item,
            ),
            (items) => [
              ...foreignTotals,
              contentItem.container(own('9', 'Own block'), foreignTotals),
              ...items,
            ],
          ),
      },
    ),
    readable(
      '90-continuity-and-template-absent',
      'No Continuity Of Content, no template identification, no relationship types.',
      smallCase(90),
      {
        isValid: false,
        change: (dataSet) =>
          [0x0040a050, 0x0040a504, 0x0040a010].reduce(
            (changed, tag) => changeEveryDataSet(changed, (one) => withoutElement(one, tag)),
            dataSet,
          ),
      },
    ),
    readable(
      '91-zero-length-values',
      'Accession number, study description, names, protocol, plane and identifiers present and of zero length.',
      smallCase(91),
      {
        isValid: false,
        warningCodes: ['value-missing'],
        change: (dataSet) =>
          changeEveryItem(
            [0x00080050, 0x00081030, 0x00100010, 0x00181000, 0x00081010].reduce(
              (changed, tag) => withElement(changed, textElement(tag, tag === 0x00100010 ? 'PN' : 'LO', '')),
              dataSet,
            ),
            (item) => {
              if (isOf('125203')(item)) return withElement(item, textElement(0x0040a160, 'UT', ''));
              if (isOf('113764')(item)) return withElement(item, { tag: 0x0040a168, vr: 'SQ', value: [] });
              return item;
            },
          ),
        expect: (report) => ({
          ...withEvents(report, { protocol: null, plane: null }),
          accessionNumber: null,
          studyDescription: null,
          patient: { ...report.patient, name: null },
          equipment: { ...report.equipment, stationName: null, serialNumber: 'QR-20417' },
          planes: report.planes.map((plane) => ({ ...plane, plane: null })),
        }),
      },
    ),
    readable(
      '92-hostile-text',
      'Markup, a spreadsheet formula, text that runs right to left, a path and NUL bytes inside names and protocols.',
      smallCase(92, {
        patient: { ...smallCase(92).patient, name: '<script>alert(1)</script>^"><img src=x>' },
        studyDescription: '=HYPERLINK("http://192.0.2.1","Open")',
        comment: '../../../../etc/passwd',
        events: [
          fluoroscopyEvent(92, 0, { protocol: '\u202Egnp.exe\u202C' }),
          fluoroscopyEvent(92, 1, { protocol: 'Fluoro\0low\0' }),
        ],
      }),
      {
        isValid: false,
        expect: (report) => withEvents(report, {}, { protocol: 'Fluorolow' }),
      },
    ),
    readable(
      '93-items-without-concept',
      'Items without a concept, without a value, of a value type that does not exist; an event container that is empty.',
      smallCase(93),
      {
        isValid: false,
        warningCodes: ['value-missing'],
        change: (dataSet) =>
          changeItems(dataSet, (items) => [
            [],
            [textElement(0x0040a040, 'CS', 'NUM')],
            [textElement(0x0040a040, 'CS', 'HOLOGRAM')],
            ...items,
            contentItem.container(dcm('113706', 'Irradiation Event X-Ray Data'), []),
          ]),
        expect: (report) => ({
          ...report,
          events: [
            ...report.events,
            Object.fromEntries(
              Object.entries(report.events[0] ?? {}).map(([field, value]) => [
                field,
                Array.isArray(value) ? [] : null,
              ]),
            ) as unknown as (typeof report.events)[number],
          ],
        }),
      },
    ),
  ];
}
