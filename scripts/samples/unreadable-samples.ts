import { writeDoseReport } from '../../server/dicom-writer/write-dose-report';
import { writeFile } from '../../server/dicom-writer/write-file';
import type { ReasonCode } from '../../shared/contract/outcome';
import { caseContent } from './case-content';
import * as objects from './other-objects';
import type { Sample } from './sample';

function unread(fileName: string, how: string, reasonCode: ReasonCode, bytes: Uint8Array): Sample {
  return { fileName, how, isValid: false, bytes, expected: { outcome: 'refused', reasonCode } };
}

const whole = () => writeDoseReport(caseContent(40));
const deflated = () => writeDoseReport(caseContent(58), { transferSyntax: 'deflated' });

/** Every sample that gives no report, with the reason that it must give. */
export function unreadableSamples(): Sample[] {
  return [
    unread(
      '40-truncated.dcm',
      'A good report cut off after 60 % of its bytes.',
      'truncated',
      whole().subarray(0, Math.floor(whole().length * 0.6)),
    ),
    unread(
      '41-ct-report.dcm',
      'Dose report of a CT scanner (TID 10011).',
      'ct-report',
      writeFile(objects.ctReport(41)),
    ),
    unread(
      '42-secondary-capture.dcm',
      'A picture of 8 × 8 pixels (Secondary Capture).',
      'image',
      writeFile(objects.secondaryCapture(42)),
    ),
    unread(
      '43-text.txt',
      'Plain text.',
      'not-dicom',
      new TextEncoder().encode('Dose report\nKAP 12.3 Gy cm2\nFluoroscopy 4.5 min\n'),
    ),
    unread(
      '44-mammography-report.dcm',
      'Dose report of a mammography unit (TID 10005).',
      'mammography-report',
      writeFile(objects.mammographyReport(44)),
    ),
    unread(
      '45-other-template.dcm',
      'A measurement report (Comprehensive SR) without dose.',
      'other-template',
      writeFile(objects.measurementReport(45)),
    ),
    unread(
      '46-prose-report.dcm',
      'A findings report in prose (Basic Text SR).',
      'prose-report',
      writeFile(objects.proseReport(46)),
    ),
    unread(
      '47-enhanced-report.dcm',
      'Enhanced X-Ray Radiation Dose SR (TID 10040), its root and first container only.',
      'enhanced-report',
      writeFile(objects.enhancedReport(47)),
    ),
    unread(
      '48-radiopharmaceutical-report.dcm',
      'Radiopharmaceutical Radiation Dose SR, its root only.',
      'radiopharmaceutical-report',
      writeFile(objects.radiopharmaceuticalReport(48)),
    ),
    unread(
      '49-unknown-transfer-syntax.dcm',
      'A good report that declares a private transfer syntax.',
      'transfer-syntax-unknown',
      writeDoseReport(caseContent(49), { declaredTransferSyntaxUid: '2.25.7031140099' }),
    ),
    unread(
      '50-no-content.dcm',
      'A dose report with observer and scope, but neither totals nor events.',
      'no-content',
      writeDoseReport(caseContent(50, { planes: [], events: [] })),
    ),
    unread(
      '51-deflate-bomb.dcm',
      'A deflated report with a comment of 80 MiB of blanks.',
      'limit-inflated-size',
      writeFile(objects.hugeReport(51), { transferSyntax: 'deflated' }),
    ),
    unread(
      '52-deep-nesting.dcm',
      'Content items nested 500 deep.',
      'limit-depth',
      writeFile(objects.deepReport(52, 500)),
    ),
    unread('53-empty.dcm', 'No bytes.', 'empty', new Uint8Array(0)),
    unread(
      '54-short-content-length.dcm',
      'The length of the content sequence is one item too short.',
      'malformed',
      objects.withShortContentLength(whole()),
    ),
    unread(
      '55-length-beyond-end.dcm',
      'The length of the content sequence passes the end of the file.',
      'truncated',
      objects.withContentLength(whole(), 0x00ffff00),
    ),
    unread(
      '56-item-outside-sequence.dcm',
      'An item stands after the content sequence, outside any sequence.',
      'malformed',
      objects.withStrayItem(whole()),
    ),
    unread(
      '57-long-text.dcm',
      'A comment of 1.5 MiB, deflated.',
      'limit-text-length',
      writeFile(objects.hugeReport(57, 1.5 * 1024 * 1024), { transferSyntax: 'deflated' }),
    ),
    unread(
      '58-deflated-and-cut.dcm',
      'A deflated report cut off after 70 % of its bytes.',
      'truncated',
      deflated().subarray(0, Math.floor(deflated().length * 0.7)),
    ),
    unread(
      '59-encapsulated-document.dcm',
      'A document of another format inside DICOM.',
      'encapsulated-document',
      writeFile(objects.encapsulatedDocument(59)),
    ),
    unread(
      '119-radiotherapy-plan.dcm',
      'An object that is neither image nor structured report.',
      'not-structured-report',
      writeFile(objects.radiotherapyPlan(119)),
    ),
    unread(
      '120-enhanced-class-usual-title.dcm',
      'Containers of TID 10040 stored under the usual dose report class.',
      'enhanced-report',
      writeFile(objects.enhancedInUsualClass(120)),
    ),
    unread(
      '121-dose-picture.dcm',
      'A dose report class with pixel data in it.',
      'image',
      writeFile(objects.reportWithPixels(121)),
    ),
    unread(
      '122-cut-in-meta-information.dcm',
      'The file ends inside the file meta information.',
      'truncated',
      whole().subarray(0, 200),
    ),
  ];
}
