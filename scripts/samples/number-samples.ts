import { textElement } from '../../server/dicom-writer/data-element';
import { dcm } from '../../server/dicom-writer/content-items';
import { fluoroscopyEvent, smallCase } from './case-content';
import { changeEveryItem, conceptOf, withElement, withoutElement } from './edit-content';
import { readable, withEvents } from './make-readable';
import type { Sample } from './sample';

const gy = (text: string) => ({ text, unit: 'Gy' });
const notMeasured = { qualifier: dcm('114006', 'Measurement failure') };

/** Decimal strings (VR DS, PS3.5 6.2), units, and what stands in their place. */
export function numberSamples(): Sample[] {
  return [
    readable(
      '68-decimal-forms',
      'Decimal strings with exponents, plus sign, blanks, leading and trailing point, 16 characters, negative zero.',
      smallCase(68, {
        events: ['+4.1E-3', ' 4.1e-03 ', '.0041', '0.00410000000000', '41.E-4', '-0'].map((text, index) =>
          fluoroscopyEvent(68, index, { referenceAirKermaGy: gy(text) }),
        ),
      }),
    ),
    readable(
      '69-no-numbers',
      'NaN, INF, decimal comma, a unit inside the number, two numbers in one, minutes and seconds with a colon.',
      smallCase(69, {
        events: ['NaN', 'INF', '0,0041', '4.1 mGy', '4 1', '1.2.3'].map((text, index) =>
          fluoroscopyEvent(69, index, {
            referenceAirKermaGy: gy(text),
            ...(index === 0 ? { irradiationDurationS: { text: '02:30', unit: 'min' } } : {}),
          }),
        ),
      }),
      { warningCodes: ['number-unreadable'], isValid: false },
    ),
    readable(
      '70-number-lists',
      'A backslash list in one decimal string for tube voltage, tube current and pulse width.',
      smallCase(70, {
        events: [
          fluoroscopyEvent(70, 0, {
            kvpValues: [{ text: '70\\72\\74', unit: 'kV' }],
            tubeCurrentValuesMa: [{ text: '40\\ 50', unit: 'mA' }],
            pulseWidthValuesMs: [{ text: '5.5\\6.5', unit: 'ms' }],
          }),
        ],
      }),
      {
        warningCodes: ['value-list'],
        isValid: false,
        expect: (report) =>
          withEvents(report, { kvpValues: [70, 72, 74], kvpMean: 72, tubeCurrentMa: 45, pulseWidthMs: 6 }),
      },
    ),
    readable(
      '71-units-absent-or-foreign',
      'Numbers without unit, with spellings that are not UCUM, with a unit of a private scheme, with a unit of another quantity.',
      smallCase(71, {
        events: [
          fluoroscopyEvent(71, 0, { kermaAreaProductGyCm2: { text: '0.00008', unit: null } }),
          fluoroscopyEvent(71, 1, { kermaAreaProductGyCm2: { text: '8', unit: 'dGy*cm2' } }),
          fluoroscopyEvent(71, 2, { kermaAreaProductGyCm2: { text: '80', unit: 'uGym2' } }),
          fluoroscopyEvent(71, 3, {
            kermaAreaProductGyCm2: { text: '0.00008', unit: 'Gy.m2', scheme: '99QUILLON' },
          }),
          fluoroscopyEvent(71, 4, { referenceAirKermaGy: { text: '4.1', unit: 'mm' } }),
        ],
      }),
      {
        warningCodes: ['unit-missing', 'unit-unknown'],
        isValid: false,
        expect: (report) => withEvents(report, {}, {}, {}, {}, { referenceAirKermaGy: null }),
      },
    ),
    readable(
      '72-qualifiers',
      'Empty Measured Value Sequences with a Numeric Value Qualifier: a dose display that failed.',
      smallCase(72, {
        events: [
          fluoroscopyEvent(72, 0, { kermaAreaProductGyCm2: notMeasured, referenceAirKermaGy: notMeasured }),
        ],
      }),
      { warningCodes: ['value-empty'] },
    ),
    readable(
      '73-floating-point-values',
      'The number as a floating-point value beside its rounded decimal string.',
      smallCase(73, {
        events: [
          fluoroscopyEvent(73, 0, {
            kermaAreaProductGyCm2: { text: '0.000081', unit: 'Gy.m2', precise: 0.0000812345678901234 },
          }),
        ],
      }),
    ),
    readable(
      '74-empty-numbers',
      'Numeric Value of zero length, and numbers without Measured Value Sequence.',
      smallCase(74, { events: [fluoroscopyEvent(74, 0, { referenceAirKermaGy: gy('') })] }),
      {
        warningCodes: ['value-empty'],
        isValid: false,
        change: (dataSet) =>
          changeEveryItem(dataSet, (item) =>
            conceptOf(item) === '122130' ? withoutElement(item, 0x0040a300) : item,
          ),
        expect: (report) => withEvents(report, { kermaAreaProductGyCm2: null }),
      },
    ),
    readable(
      '75-repeated-values',
      'A value that should stand once stands twice: the first counts.',
      smallCase(75),
      {
        warningCodes: ['value-repeated'],
        isValid: false,
        change: (dataSet) => {
          const twice = changeEveryItem(dataSet, (item) =>
            conceptOf(item) === '113706'
              ? item.map((element) =>
                  element.tag === 0x0040a730
                    ? {
                        ...element,
                        value: (element.value as (typeof item)[]).flatMap((one) =>
                          conceptOf(one) === '113742' ? [one, one] : [one],
                        ),
                      }
                    : element,
                )
              : item,
          );
          return withElement(twice, textElement(0x0040a493, 'CS', 'UNVERIFIED'));
        },
      },
    ),
  ];
}
