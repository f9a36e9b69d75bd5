import { caseContent, fluoroscopyEvent } from './case-content';
import { biplaneCase, manyEventsCase, oddUnitsCase, rotationalEvent, totalsOnlyCase } from './case-variants';
import { mobileCase, radiographyCase } from './other-rooms';
import { readable } from './make-readable';
import type { Sample } from './sample';

/** Rooms, encodings and the commonest deviations: the first samples. */
export function basicSamples(): Sample[] {
  return [
    readable(
      '01-single-plane',
      'Angiography room, one plane: fluoroscopy, acquisition, rotation with end angles and two filters.',
      {
        ...caseContent(1),
        events: [...caseContent(1).events, rotationalEvent(1, 3)],
        comment: 'Table moved by hand between runs.',
      },
    ),
    readable('02-biplane', 'Two planes: pairs of events with equal start, totals per plane.', biplaneCase(2)),
    readable(
      '03-odd-units',
      'mGy, uGy, cGy.cm2, dGy.cm2, mGy.cm2, uGy.m2, min, ms, cm in place of the standard units; exponents, plus sign, leading point.',
      oddUnitsCase(3),
    ),
    readable(
      '04-kvp-per-pulse',
      'One KVP, tube current and pulse width item for each pulse, lists of different length; another event has only the average tube current.',
      {
        ...caseContent(4),
        events: [
          fluoroscopyEvent(4, 0, {
            kvpValues: [68, 70.5, 73, 74, 74.5],
            tubeCurrentValuesMa: [40, 52, 61, 66],
            pulseWidthValuesMs: [5.8, 6, 6.4],
          }),
          fluoroscopyEvent(4, 1, { tubeCurrentValuesMa: [], averageTubeCurrentMa: 57.25 }),
          fluoroscopyEvent(4, 2, { tubeCurrentValuesMa: [], exposureValuesMas: [31.5] }),
        ],
      },
      { warningCodes: ['value-missing'] },
    ),
    readable('05-implicit-little-endian', 'Implicit VR little endian.', caseContent(5), {
      options: { transferSyntax: 'implicit-little-endian' },
    }),
    readable(
      '06-explicit-big-endian',
      'Explicit VR big endian, sequences of undefined length.',
      caseContent(6),
      {
        options: { transferSyntax: 'explicit-big-endian', hasUndefinedLengths: true },
      },
    ),
    readable('07-deflated', 'Deflated explicit VR little endian.', caseContent(7), {
      options: { transferSyntax: 'deflated' },
    }),
    readable(
      '08-bare-data-set',
      'Implicit VR little endian without preamble and file meta information.',
      caseContent(8),
      {
        options: { transferSyntax: 'implicit-little-endian', hasMetaHeader: false },
        warningCodes: ['no-meta-header'],
      },
    ),
    readable(
      '09-no-preamble',
      'File meta information first, the 128 bytes and DICM missing.',
      caseContent(9),
      { options: { hasPreamble: false } },
    ),
    readable(
      '10-mobile-c-arm',
      'Mobile C-arm: no angles, no table, no isocentre, no field size, no plane; reference point 30 cm in front of the image receptor; continuous fluoroscopy.',
      mobileCase(10),
      { warningCodes: ['value-missing'] },
    ),
    readable(
      '11-radiography',
      'Integrated radiography room (DX): exposures only, TID 10007 totals, column angulation.',
      radiographyCase(11),
      { warningCodes: ['value-missing'] },
    ),
    readable('12-utf8-names', 'Names beyond ASCII in UTF-8.', {
      ...caseContent(12),
      studyDescription: 'Artériographie hépatique',
      patient: { ...caseContent(12).patient, name: 'Żurawska-Öst^Zoë^^Dr' },
    }),
    readable(
      '13-iso2022-names',
      'A Japanese name in ISO 2022 IR 87 with its three component groups.',
      {
        ...caseContent(13),
        patient: { ...caseContent(13).patient, name: 'Hoshikawa^Tsuki=星川^月=ほしかわ^つき' },
      },
      { options: { characterSet: 'ISO 2022 IR 87' } },
    ),
    readable(
      '14-gb18030-names',
      'A Chinese name in GB18030 whose second bytes look like delimiters, which dciodvfy takes for such.',
      {
        ...caseContent(14),
        patient: { ...caseContent(14).patient, name: 'Wu^Yunqi=烏^雲誠' },
      },
      { options: { characterSet: 'GB18030' }, isValid: false },
    ),
    readable(
      '15-korean-names',
      'A Korean name in ISO 2022 IR 149.',
      {
        ...caseContent(15),
        patient: { ...caseContent(15).patient, name: 'Haneul^Byeol=하늘^별' },
      },
      { options: { characterSet: 'ISO 2022 IR 149' } },
    ),
    readable(
      '16-unknown-unit',
      'The kerma-area product of one event in a unit that is no UCUM code, another one without a readable number.',
      {
        ...caseContent(16),
        events: [
          fluoroscopyEvent(16, 0, { kermaAreaProductGyCm2: { text: '8000', unit: 'Gym2' } }),
          fluoroscopyEvent(16, 1, { referenceAirKermaGy: { text: '0,0042', unit: 'Gy' } }),
        ],
      },
      { warningCodes: ['unit-unknown', 'number-unreadable'], isValid: false },
    ),
    readable('17-snomed-rt', 'An older report: SNOMED-RT codes throughout, stored as Enhanced SR.', {
      ...caseContent(17),
      terminology: 'SRT',
      sopClassUid: '1.2.840.10008.5.1.4.1.1.88.22',
    }),
    readable(
      '18-mpps-totals',
      'Totals derived from a performed procedure step, no events.',
      totalsOnlyCase(18),
      { warningCodes: ['events-missing', 'value-missing'] },
    ),
    readable(
      '19-equipment-in-tree',
      'Maker, model and serial only at the irradiating device, times with an offset and fractions.',
      {
        ...caseContent(19),
        isEquipmentOnlyInTree: true,
        events: caseContent(19).events.map((event) => ({
          ...event,
          startedAt: `${event.startedAt}.250+01:00`,
        })),
      },
    ),
    readable('20-quality-control', 'A phantom exposure: intent Quality Control.', {
      ...caseContent(20),
      intent: { value: '113680', scheme: 'DCM', meaning: 'Quality Control Intent' },
      patient: { ...caseContent(20).patient, name: 'Phantom^Water 20 cm', id: 'QC-20' },
    }),
    readable('21-300-events', '300 events, the size of a long case.', manyEventsCase(21), {
      warningCodes: ['value-missing'],
    }),
  ];
}
