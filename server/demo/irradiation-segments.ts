import type { DemoIrradiationEvent, DemoPlane } from './demo-types';
import type { Random } from './random';
import type { ImagingPlan } from './techniques.table-data';

/** One press of the pedal: one irradiation event, or two where both planes fire. */
export interface Segment {
  type: DemoIrradiationEvent['type'];
  planes: readonly DemoPlane[];
  durationS: number;
  /** Seconds after the procedure's first irradiation. */
  offsetS: number;
}

const clamp = (value: number, low: number, high: number) => Math.min(high, Math.max(low, value));
const roundToTenth = (value: number) => Math.round(value * 10) / 10;

/** Share of the fluoroscopy time (both planes added) that the lateral plane has. */
const lateralTimeShare = 0.3;

type Draft = Omit<Segment, 'offsetS'>;

/** Random parts of a whole, each at least 0.5 s. */
function splitTime(totalS: number, parts: number, random: Random): number[] {
  if (parts === 0) return [];
  const weights = Array.from({ length: parts }, () => 0.15 - Math.log(1 - random.uniform()));
  const sum = weights.reduce((a, b) => a + b, 0);
  return weights.map((weight) => Math.max(0.5, roundToTenth((totalS * weight) / sum)));
}

function draftFluoroscopy(plan: ImagingPlan, fluoroscopyTimeS: number, isBiplane: boolean, random: Random) {
  const [low, high] = plan.fluoroscopyCount;
  const count = Math.round(
    clamp((fluoroscopyTimeS / plan.pressS) * Math.exp(0.2 * random.normal()), low, high),
  );
  const segments = (planes: readonly DemoPlane[], totalS: number, parts: number): Draft[] =>
    splitTime(totalS, parts, random).map((durationS) => ({ type: 'fluoroscopy', planes, durationS }));
  if (!isBiplane) return segments(['single'], fluoroscopyTimeS, count);
  const pairedS = lateralTimeShare * fluoroscopyTimeS * Math.exp(0.1 * random.normal());
  const pairedCount = Math.max(1, Math.round(count * 0.35));
  return random.shuffle([
    ...segments(['A', 'B'], pairedS, pairedCount),
    ...segments(['A'], fluoroscopyTimeS - 2 * pairedS, Math.max(1, count - pairedCount)),
  ]);
}

function draftAcquisitions(
  plan: ImagingPlan,
  relativeKerma: number,
  isBiplane: boolean,
  random: Random,
): Draft[] {
  const [low, high] = plan.acquisitionCount;
  const middle = (low + high) / 2;
  const count = Math.round(
    clamp(middle * relativeKerma ** 0.35 * Math.exp(0.25 * random.normal()), low, high),
  );
  const [shortS, longS] = plan.family.acquisitionDurationS;
  const runs = Array.from({ length: count }, (): Draft => {
    const isStepping = plan.family.acquisitionProtocols.includes('Leg stepping') && random.chance(0.15);
    return {
      type: isStepping ? 'stepping-acquisition' : 'stationary-acquisition',
      planes: !isBiplane ? ['single'] : random.chance(0.8) ? ['A', 'B'] : ['A'],
      durationS: roundToTenth(random.between(shortS, longS) * (isStepping ? 2 : 1)),
    };
  });
  if (random.chance(plan.rotationalShare)) {
    const rotations = random.integer(1, 2);
    for (let rotation = 0; rotation < rotations; rotation++)
      runs.splice(random.integer(0, runs.length), 0, {
        type: 'rotational-acquisition',
        planes: [isBiplane ? 'A' : 'single'],
        durationS: random.pick([5, 6, 8]),
      });
  }
  return runs;
}

/** Runs follow presses that look for the place; pauses fill the procedure's span. */
function setOnTimeline(
  fluoroscopy: Draft[],
  acquisitions: Draft[],
  spanS: number,
  random: Random,
): Segment[] {
  const runsAfter: Draft[][] = fluoroscopy.map(() => []);
  for (const run of acquisitions) runsAfter[random.integer(0, fluoroscopy.length - 1)]?.push(run);
  const sequence = fluoroscopy.flatMap((press, index) => [press, ...(runsAfter[index] ?? [])]);
  const beamS = sequence.reduce((sum, segment) => sum + segment.durationS, 0);
  const pauseS = Math.max(3 * sequence.length, spanS - beamS);
  const weights = sequence.map(() => 0.1 - Math.log(1 - random.uniform()));
  const weightSum = weights.reduce((a, b) => a + b, 0);
  let clockS = 0;
  return sequence.map((segment, index) => {
    const offsetS = roundToTenth(clockS);
    clockS += segment.durationS + (pauseS * (weights[index] ?? 0)) / weightSum;
    return { ...segment, offsetS };
  });
}

/**
 * The pedal's story of one procedure: fluoroscopy adding up to the given time (planes added),
 * acquisitions between, pauses, in order of time.
 *
 * @param relativeKerma the procedure's K a,r over its type's median: longer stories need more runs
 */
export function layOutSegments(
  plan: ImagingPlan,
  procedure: { fluoroscopyTimeS: number; relativeKerma: number; isBiplane: boolean; spanS: number },
  random: Random,
): Segment[] {
  const { isBiplane, spanS } = procedure;
  const fluoroscopy = draftFluoroscopy(plan, procedure.fluoroscopyTimeS, isBiplane, random);
  const acquisitions = draftAcquisitions(plan, procedure.relativeKerma, isBiplane, random);
  return setOnTimeline(fluoroscopy, acquisitions, spanS, random);
}
