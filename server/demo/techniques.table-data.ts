type Range = readonly [low: number, high: number];
/** Primary angle (LAO positive), secondary angle (cranial positive), weight. */
export type View = readonly [primaryDeg: number, secondaryDeg: number, weight: number];

/** How a family of procedures is imaged. Invented, inside the usual range of the trade. */
export interface ImagingFamily {
  views: readonly View[];
  /** mm Cu from thin to large patients. */
  fluoroscopyCopperMm: readonly number[];
  acquisitionCopperMm: readonly number[];
  fluoroscopyPulsesPerS: readonly (readonly [number, number])[];
  acquisitionFramesPerS: number;
  acquisitionDurationS: Range;
  acquisitionKvpOffset: number;
  kvpSpread: number;
  fluoroscopyPulseWidthMs: Range;
  acquisitionPulseWidthMs: Range;
  sourceToDetectorMm: Range;
  tableHeightMm: Range;
  fluoroscopyProtocols: readonly string[];
  acquisitionProtocols: readonly string[];
}

const neuro: ImagingFamily = {
  views: [
    [0, 15, 4],
    [0, 25, 2],
    [-25, 10, 1.5],
    [30, 5, 1.5],
    [-45, 0, 0.7],
    [55, -10, 0.7],
  ],
  fluoroscopyCopperMm: [0.3, 0.2, 0.2, 0.1],
  acquisitionCopperMm: [0.1, 0.1, 0],
  fluoroscopyPulsesPerS: [
    [7.5, 3],
    [15, 1],
  ],
  acquisitionFramesPerS: 3,
  acquisitionDurationS: [6, 12],
  acquisitionKvpOffset: -2,
  kvpSpread: 2.5,
  fluoroscopyPulseWidthMs: [6, 12],
  acquisitionPulseWidthMs: [60, 110],
  sourceToDetectorMm: [1000, 1150],
  tableHeightMm: [-40, 20],
  fluoroscopyProtocols: ['Head FL low', 'Head FL roadmap'],
  acquisitionProtocols: ['Head DSA 3', 'Head DSA carotid'],
};

const abdomen: ImagingFamily = {
  views: [
    [0, 0, 5],
    [25, 0, 1.2],
    [-30, 0, 1.2],
    [15, 15, 0.6],
    [-20, -12, 0.6],
  ],
  fluoroscopyCopperMm: [0.9, 0.6, 0.3, 0.2],
  acquisitionCopperMm: [0.3, 0.2, 0.1],
  fluoroscopyPulsesPerS: [
    [7.5, 3],
    [4, 2],
  ],
  acquisitionFramesPerS: 2,
  acquisitionDurationS: [6, 14],
  acquisitionKvpOffset: -3,
  kvpSpread: 3.5,
  fluoroscopyPulseWidthMs: [5, 12],
  acquisitionPulseWidthMs: [50, 100],
  sourceToDetectorMm: [1020, 1180],
  tableHeightMm: [-60, 40],
  fluoroscopyProtocols: ['Abdomen FL', 'Abdomen FL low'],
  acquisitionProtocols: ['Abdomen DSA 2', 'Abdomen single'],
};

const pelvis: ImagingFamily = {
  ...abdomen,
  views: [
    [0, 0, 2],
    [35, -10, 2.5],
    [-35, -10, 2.5],
    [45, 0, 1],
  ],
  fluoroscopyProtocols: ['Pelvis FL', 'Pelvis FL low'],
  acquisitionProtocols: ['Pelvis DSA 2'],
};

const leg: ImagingFamily = {
  ...abdomen,
  views: [
    [0, 0, 5],
    [30, 0, 1.5],
    [-30, 0, 1.5],
  ],
  fluoroscopyCopperMm: [0.9, 0.6, 0.6, 0.3],
  acquisitionKvpOffset: -6,
  kvpSpread: 4,
  fluoroscopyProtocols: ['Leg FL'],
  acquisitionProtocols: ['Leg DSA 2', 'Leg stepping'],
};

const line: ImagingFamily = {
  ...abdomen,
  views: [
    [0, 0, 9],
    [10, 0, 1],
  ],
  fluoroscopyCopperMm: [0.9, 0.6, 0.3],
  kvpSpread: 2,
  fluoroscopyProtocols: ['Chest FL low'],
  acquisitionProtocols: ['Chest single'],
};

const coronary: ImagingFamily = {
  views: [
    [-30, -20, 2],
    [-10, 38, 2],
    [35, 25, 1.8],
    [45, -25, 1.6],
    [-30, 0, 1.2],
    [40, 0, 1.5],
    [0, 30, 1],
    [0, -30, 0.8],
    [85, 0, 0.3],
  ],
  fluoroscopyCopperMm: [0.9, 0.6, 0.4, 0.1],
  acquisitionCopperMm: [0.2, 0.1, 0],
  fluoroscopyPulsesPerS: [[7.5, 1]],
  acquisitionFramesPerS: 15,
  acquisitionDurationS: [3, 6.5],
  acquisitionKvpOffset: 1,
  kvpSpread: 3,
  fluoroscopyPulseWidthMs: [5, 9],
  acquisitionPulseWidthMs: [6, 9],
  sourceToDetectorMm: [1000, 1130],
  tableHeightMm: [-30, 50],
  fluoroscopyProtocols: ['Coronary FL 7.5'],
  acquisitionProtocols: ['Coronary cine 15'],
};

const valve: ImagingFamily = {
  ...coronary,
  views: [
    [0, 0, 3],
    [-5, -15, 2],
    [10, -8, 2],
    [-20, 5, 1],
  ],
  fluoroscopyProtocols: ['Valve FL 7.5'],
  acquisitionProtocols: ['Valve cine 15'],
};

const rhythm: ImagingFamily = {
  ...coronary,
  views: [
    [0, 0, 4],
    [-30, 0, 3],
    [40, 0, 3],
  ],
  fluoroscopyCopperMm: [0.9, 0.9, 0.6, 0.4],
  fluoroscopyPulsesPerS: [
    [4, 2],
    [7.5, 1],
  ],
  acquisitionFramesPerS: 7.5,
  fluoroscopyProtocols: ['Rhythm FL low'],
  acquisitionProtocols: ['Rhythm cine 7.5'],
};

/** How many irradiations, how long, and how much of K a,r comes from acquisitions. */
export interface ImagingPlan {
  family: ImagingFamily;
  acquisitionKermaShare: number;
  /** Mean time on the pedal at one press. */
  pressS: number;
  fluoroscopyCount: Range;
  acquisitionCount: Range;
  /** Share of procedures with one or more rotational runs. */
  rotationalShare: number;
  /** Minutes of the procedure beside the fluoroscopy-bound part. */
  baseDurationMin: number;
}

const plan = (
  family: ImagingFamily,
  acquisitionKermaShare: number,
  pressS: number,
  fluoroscopyCount: Range,
  acquisitionCount: Range,
  rotationalShare: number,
  baseDurationMin: number,
): ImagingPlan => ({
  family,
  acquisitionKermaShare,
  pressS,
  fluoroscopyCount,
  acquisitionCount,
  rotationalShare,
  baseDurationMin,
});

export const imagingPlans: Readonly<Record<string, ImagingPlan>> = {
  'NEU-DSA': plan(neuro, 0.78, 14, [14, 40], [14, 26], 0.1, 20),
  'NEU-ANE': plan(neuro, 0.45, 26, [45, 85], [12, 26], 0.7, 45),
  'NEU-THR': plan(neuro, 0.5, 26, [25, 60], [12, 22], 0.05, 25),
  'NEU-AVM': plan(neuro, 0.5, 40, [55, 90], [18, 34], 0.3, 60),
  'IR-CVC': plan(line, 0.1, 11, [3, 5], [0, 1], 0, 8),
  'IR-IVCF': plan(abdomen, 0.55, 28, [4, 8], [2, 3], 0, 12),
  'IR-NEPH': plan(abdomen, 0.15, 25, [5, 14], [0, 3], 0, 15),
  'IR-PTBD': plan(abdomen, 0.25, 40, [10, 28], [2, 6], 0, 25),
  'IR-TIPS': plan(abdomen, 0.45, 45, [25, 60], [6, 14], 0.1, 45),
  'IR-TACE': plan(abdomen, 0.6, 30, [15, 38], [6, 14], 0.4, 30),
  'IR-PAE': plan(pelvis, 0.55, 45, [30, 60], [10, 22], 0.5, 40),
  'IR-PTA': plan(leg, 0.6, 38, [10, 30], [8, 18], 0, 30),
  'CA-DX': plan(coronary, 0.62, 22, [5, 14], [7, 11], 0, 12),
  'CA-PCI': plan(coronary, 0.45, 28, [14, 36], [11, 24], 0, 20),
  'CA-CTO': plan(coronary, 0.4, 36, [45, 90], [18, 36], 0, 45),
  'CA-TAVI': plan(valve, 0.45, 36, [18, 36], [5, 10], 0, 40),
  'CA-AFA': plan(rhythm, 0.2, 40, [9, 26], [0, 3], 0.05, 90),
  'CA-PM': plan(rhythm, 0.08, 30, [5, 11], [0, 2], 0, 45),
};
