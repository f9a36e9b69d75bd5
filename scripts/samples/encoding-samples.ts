import { textElement } from '../../server/dicom-writer/data-element';
import { smallCase } from './case-content';
import { changeEveryDataSet, withElement } from './edit-content';
import { readable } from './make-readable';
import type { Sample } from './sample';

/** How the file is wrapped and laid out (PS3.10 section 7, PS3.5 annex A). */
export function encodingSamples(): Sample[] {
  return [
    readable(
      '22-undefined-lengths',
      'Explicit little endian, sequences and items of undefined length.',
      smallCase(22),
      {
        options: { hasUndefinedLengths: true },
      },
    ),
    readable(
      '23-implicit-undefined',
      'Implicit little endian, sequences and items of undefined length.',
      smallCase(23),
      {
        options: { transferSyntax: 'implicit-little-endian', hasUndefinedLengths: true },
      },
    ),
    readable(
      '24-bare-explicit',
      'Explicit little endian without preamble and file meta information.',
      smallCase(24),
      {
        options: { hasMetaHeader: false },
        warningCodes: ['no-meta-header'],
      },
    ),
    readable(
      '25-bare-big-endian',
      'Explicit big endian without preamble and file meta information.',
      smallCase(25),
      {
        options: { transferSyntax: 'explicit-big-endian', hasMetaHeader: false },
        warningCodes: ['no-meta-header'],
        isValid: false,
      },
    ),
    readable('26-wrong-transfer-syntax', 'Declared explicit, written implicit.', smallCase(26), {
      options: { transferSyntax: 'implicit-little-endian', declaredTransferSyntaxUid: '1.2.840.10008.1.2.1' },
      warningCodes: ['syntax-mismatch'],
      isValid: false,
    }),
    readable('27-no-transfer-syntax', 'File meta information with an empty transfer syntax.', smallCase(27), {
      options: { declaredTransferSyntaxUid: '' },
      warningCodes: ['no-meta-header'],
      isValid: false,
    }),
    readable('28-trailing-padding', '640 bytes of Data Set Trailing Padding (FFFC,FFFC).', smallCase(28), {
      options: { trailingPaddingBytes: 640 },
    }),
    readable(
      '29-private-groups',
      'Private elements with their creators in the header and in every item, some with the letters of known values.',
      smallCase(29),
      {
        change: (dataSet) =>
          changeEveryDataSet(dataSet, (one) =>
            withElement(
              withElement(one, textElement(0x00410010, 'LO', 'QUILLON PRIVATE')),
              textElement(0x00411001, 'LO', '113722'),
            ),
          ),
      },
    ),
    readable('30-deflated-undefined', 'Deflated, with sequences of undefined length.', smallCase(30), {
      options: { transferSyntax: 'deflated', hasUndefinedLengths: true },
    }),
  ];
}
