import type { DemoCalibrationFactor, DemoEquipment, DemoRoomCode } from './demo-types';

export const demoRooms: readonly { code: DemoRoomCode; name: string }[] = [
  { code: 'NR1', name: 'Neuro biplane suite' },
  { code: 'IR1', name: 'Interventional radiology 1' },
  { code: 'IR2', name: 'Interventional radiology 2' },
  { code: 'CL1', name: 'Catheter laboratory' },
];

/** Month in which the second interventional room got its new machine. */
export const replacementMonth = 15;

/** Makers, models and serial numbers are invented. */
export const demoEquipment: readonly DemoEquipment[] = [
  {
    key: 'NR1-1',
    room: 'NR1',
    manufacturer: 'Pellworth Imaging',
    modelName: 'Twinarc B2',
    serialNumber: 'PW-B2-0117',
    stationName: 'MCNR1',
    isBiplane: true,
    sourceToIsocenterMm: 765,
    fromMonth: null,
    toMonth: null,
  },
  {
    key: 'IR1-1',
    room: 'IR1',
    manufacturer: 'Pellworth Imaging',
    modelName: 'Archway C7',
    serialNumber: 'PW-C7-0342',
    stationName: 'MCIR1',
    isBiplane: false,
    sourceToIsocenterMm: 785,
    fromMonth: null,
    toMonth: null,
  },
  {
    key: 'IR2-1',
    room: 'IR2',
    manufacturer: 'Karrowby X-Ray Works',
    modelName: 'Gantry 400',
    serialNumber: 'KX-400-0056',
    stationName: 'MCIR2',
    isBiplane: false,
    sourceToIsocenterMm: 720,
    fromMonth: null,
    toMonth: replacementMonth - 1,
  },
  {
    key: 'IR2-2',
    room: 'IR2',
    manufacturer: 'Pellworth Imaging',
    modelName: 'Archway C9',
    serialNumber: 'PW-C9-0009',
    stationName: 'MCIR2',
    isBiplane: false,
    sourceToIsocenterMm: 785,
    fromMonth: replacementMonth,
    toMonth: null,
  },
  {
    key: 'CL1-1',
    room: 'CL1',
    manufacturer: 'Karrowby X-Ray Works',
    modelName: 'Ventric Arc 8',
    serialNumber: 'KX-VA8-0214',
    stationName: 'MCCL1',
    isBiplane: false,
    sourceToIsocenterMm: 765,
    fromMonth: null,
    toMonth: null,
  },
];

const row = (
  equipmentKey: string,
  plane: DemoCalibrationFactor['plane'],
  quantity: DemoCalibrationFactor['quantity'],
  factor: number,
  fromMonth: number,
  note: string,
): DemoCalibrationFactor => ({ equipmentKey, plane, quantity, factor, fromMonth, note });

/** Invented. Lateral plane of the neuro room: found far off in month 6, repaired the same month. */
export const demoCalibrationFactors: readonly DemoCalibrationFactor[] = [
  row('NR1-1', 'A', 'reference-air-kerma', 1.04, 1, 'Annual evaluation'),
  row('NR1-1', 'A', 'kerma-area-product', 1.03, 1, 'Annual evaluation'),
  row('NR1-1', 'B', 'reference-air-kerma', 1.08, 1, 'Annual evaluation'),
  row('NR1-1', 'B', 'kerma-area-product', 1.06, 1, 'Annual evaluation'),
  row(
    'NR1-1',
    'B',
    'reference-air-kerma',
    1.62,
    6,
    'Display reads 38 % low: out of tolerance, service called',
  ),
  row('NR1-1', 'B', 'reference-air-kerma', 1.05, 7, 'After service'),
  row('IR1-1', 'single', 'reference-air-kerma', 1.1, 1, 'Annual evaluation'),
  row('IR1-1', 'single', 'reference-air-kerma', 1.12, 3, 'Annual evaluation'),
  row('IR1-1', 'single', 'kerma-area-product', 1.09, 3, 'Annual evaluation'),
  row('IR2-1', 'single', 'reference-air-kerma', 0.92, 1, 'Annual evaluation'),
  row('IR2-1', 'single', 'kerma-area-product', 0.94, 1, 'Annual evaluation'),
  row('IR2-2', 'single', 'reference-air-kerma', 1.02, replacementMonth, 'Acceptance'),
  row('IR2-2', 'single', 'kerma-area-product', 1.01, replacementMonth, 'Acceptance'),
  row('CL1-1', 'single', 'reference-air-kerma', 0.97, 1, 'Annual evaluation'),
  row('CL1-1', 'single', 'kerma-area-product', 0.98, 1, 'Annual evaluation'),
];
