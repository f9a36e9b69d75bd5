import { contentItem, dcm } from '../../server/dicom-writer/content-items';
import { textElement } from '../../server/dicom-writer/data-element';
import { fluoroscopyEvent, smallCase } from './case-content';
import { changeEveryDataSet, changeEveryItem, changeItems, conceptOf, withElement } from './edit-content';
import { readable, withEvents } from './make-readable';
import type { Sample } from './sample';

const own = (value: string, meaning: string) => ({ value, scheme: '99QUILLON', meaning });

/** Codes that are long, unknown, worded otherwise, or of other templates (PS3.3 8.8). */
export function codeSamples(): Sample[] {
  return [
    readable(
      '87-long-and-urn-codes',
      'Protocol names aside, an anatomy under a Long Code Value and a target region under a URN.',
      smallCase(87, {
        events: [
          fluoroscopyEvent(87, 0, {
            anatomy: { value: 'HEPATOBILIARY-SYSTEM-LEFT-LOBE', scheme: '99QUILLON', meaning: 'Left lobe' },
            targetRegion: { value: 'urn:oid:2.25.70311400', scheme: '', meaning: 'Liver' },
          }),
        ],
      }),
      { isValid: false },
    ),
    readable(
      '88-unknown-codes',
      'Unknown kind of exposure, plane, filter type, filter material and fluoroscopy mode: kept with their meanings.',
      smallCase(88, {
        events: [
          fluoroscopyEvent(88, 0, {
            type: own('B7', 'Burst'),
            fluoroMode: own('M3', 'High detail'),
          }),
        ],
      }),
      {
        warningCodes: ['event-type-unknown', 'code-unknown', 'plane-unknown'],
        isValid: false,
        change: (dataSet) =>
          changeEveryDataSet(dataSet, (one) =>
            one.some(
              (element) =>
                element.value === '113622' || element.value === '113653' || element.value === '105837005',
            )
              ? withElement(
                  withElement(one, textElement(0x00080102, 'SH', '99QUILLON')),
                  textElement(0x00080104, 'LO', 'Something new'),
                )
              : one,
          ),
        expect: (report) => ({
          ...withEvents(report, {
            plane: null,
            filters: [{ type: null, material: null, minThicknessMm: 0.3, maxThicknessMm: 0.3 }],
          }),
          planes: report.planes.map((plane) => ({ ...plane, plane: null })),
        }),
      },
    ),
    readable(
      '89-code-meanings-foreign-or-empty',
      'Meanings of codes translated or empty: the code values count.',
      smallCase(89),
      {
        isValid: false,
        change: (dataSet) =>
          changeEveryDataSet(dataSet, (one) =>
            one.some((element) => element.tag === 0x00080104)
              ? withElement(
                  one,
                  textElement(
                    0x00080104,
                    'LO',
                    one.some((element) => element.value === '113702') ? 'Kumulierte Dosisdaten' : '',
                  ),
                )
              : one,
          ),
      },
    ),
    readable(
      '94-concepts-of-other-templates',
      'Items of the standard terminology that no dose template has, kept beside the values.',
      smallCase(94),
      {
        isValid: false,
        change: (dataSet) =>
          changeEveryItem(dataSet, (item) =>
            conceptOf(item) === '113706'
              ? changeItems(item, (items) => [
                  ...items,
                  contentItem.number(dcm('122094', 'Rate of administration'), { text: '4', unit: 'ml/s' }),
                  contentItem.text('CONTAINS', dcm('121071', 'Finding'), 'Filled slowly'),
                ])
              : item,
          ),
      },
    ),
  ];
}
