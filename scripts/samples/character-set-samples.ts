import { textElement } from '../../server/dicom-writer/data-element';
import type { DoseReportContent } from '../../server/dicom-writer/dose-report-content';
import type { WriterCharacterSet } from '../../server/dicom-writer/encode-text';
import { fluoroscopyEvent, smallCase } from './case-content';
import { changeEveryItem, conceptOf, withElement } from './edit-content';
import { readable } from './make-readable';
import type { Sample } from './sample';

function named(sample: number, name: string, protocol = 'Fluoro low'): DoseReportContent {
  const base = smallCase(sample);
  return {
    ...base,
    patient: { ...base.patient, name },
    events: [fluoroscopyEvent(sample, 0, { protocol })],
  };
}

/** Character set, name and protocol in it; the names are invented. */
const declaredWell: [string, Exclude<WriterCharacterSet, null>, string, string][] = [
  ['31-latin-1', 'ISO_IR 100', 'Bjørnö^Lærke', 'Artère rénale'],
  ['32-latin-2', 'ISO_IR 101', 'Čížková-Řepa^Žofie', 'Průtok ledvin'],
  ['33-cyrillic', 'ISO_IR 144', 'Берёзова^Лада', 'Печень'],
  ['34-greek-extension', 'ISO 2022 IR 126', 'Theodora=Δελφινίδου^Ηλέκτρα', 'Νεφρός'],
  ['35-hebrew', 'ISO_IR 138', 'גורן^נעה', 'כליה'],
  ['36-arabic', 'ISO_IR 127', 'نخيل^سمر', 'كلية'],
  ['37-thai', 'ISO_IR 166', 'ดอกไม้^ฟ้า', 'ไต'],
  ['38-half-width-kana', 'ISO_IR 13', 'ﾎｼｶﾜ^ﾂｷ', 'ｼﾞﾝｿﾞｳ'],
  ['39-gbk', 'GBK', 'Xing^He=星^河', '肝动脉'],
  ['60-chinese-extension', 'ISO 2022 IR 58', 'Xing^He=星^河', '肝动脉'],
  ['61-latin-2-extension', 'ISO 2022 IR 101', 'Čížková^Žofie', 'Průtok'],
];

/** pydicom and dciodvfy of Debian 12 do not know every set. */
const isKnownOutside = (term: string) => !['ISO_IR 138', 'ISO_IR 127', 'ISO_IR 13', 'GBK'].includes(term);

/** Specific Character Set (0008,0005) in its forms, right, wrong and missing (PS3.3 C.12.1.1.2). */
export function characterSetSamples(): Sample[] {
  const french = 'Fougère-Boué^Maëlle';
  return [
    ...declaredWell.map(([file, term, name, protocol]) =>
      readable(file, `Name and protocol in ${term}.`, named(Number(file.slice(0, 2)), name, protocol), {
        options: { characterSet: term },
        isValid: isKnownOutside(term),
      }),
    ),
    readable('62-undeclared-utf-8', 'UTF-8 without Specific Character Set.', named(62, french), {
      options: { characterSet: 'ISO_IR 192', declaredCharacterSet: null },
      warningCodes: ['character-set-undeclared'],
      isValid: false,
    }),
    readable('63-undeclared-latin-1', 'Latin-1 without Specific Character Set.', named(63, french), {
      options: { characterSet: 'ISO_IR 100', declaredCharacterSet: null },
      warningCodes: ['character-set-undeclared'],
      isValid: false,
    }),
    readable('64-latin-1-that-is-utf-8', 'Declared ISO_IR 100, written in UTF-8.', named(64, french), {
      options: { characterSet: 'ISO_IR 192', declaredCharacterSet: 'ISO_IR 100' },
      warningCodes: ['character-set-wrong'],
      isValid: false,
    }),
    readable('65-utf-8-that-is-latin-1', 'Declared ISO_IR 192, written in Latin-1.', named(65, french), {
      options: { characterSet: 'ISO_IR 100', declaredCharacterSet: 'ISO_IR 192' },
      warningCodes: ['character-set-wrong'],
      isValid: false,
    }),
    readable(
      '66-invalid-term',
      'Specific Character Set LATIN1, which is no term of the standard.',
      named(66, french),
      {
        options: { characterSet: 'ISO_IR 100', declaredCharacterSet: 'LATIN1' },
        warningCodes: ['character-set-unknown'],
        isValid: false,
      },
    ),
    readable(
      '67-item-character-set',
      'The file is in ISO_IR 100, the item of the protocol in ISO_IR 144 of its own.',
      named(67, french, 'Сосуды почки'),
      {
        options: { characterSet: 'ISO_IR 100' },
        change: (dataSet) =>
          changeEveryItem(dataSet, (item) =>
            conceptOf(item) === '125203'
              ? withElement(item, textElement(0x00080005, 'CS', 'ISO_IR 144'))
              : item,
          ),
      },
    ),
  ];
}
