import { probit, quantileSorted } from 'simple-statistics';
import type { DemoBooking, DemoProcedureType, DemoQuartiles, DemoTotals } from './demo-types';
import { createRandom } from './random';
import { replacementMonth } from './rooms.table-data';
import { fluoroscopyTimeFactor, kermaRateFactor } from './staff.table-data';

/** Third quartile of the standard normal distribution. */
const upperQuartileZ = 0.6745;
/** Correlation of ln FT and ln K a,r; Miller 2003 (RAD-IR) found r = 0.79 on the linear scale. */
const timeKermaCorrelation = 0.75;
/** Spread of the mean field area beside what follows from K a,r. Invented. */
const fieldAreaLogSigma = 0.28;
/** The new machine of the second interventional room works at 0.65 of the old one's kerma rate. */
const replacementRateFactor = 0.65;

const logSigma = ({ median, p75 }: DemoQuartiles): number => Math.log(p75 / median) / upperQuartileZ;

/** One normal deviate from each of n equal slices of probability, in random order. */
function stratifiedNormals(count: number, ...key: string[]): number[] {
  const random = createRandom(...key);
  const deviates = Array.from({ length: count }, (_, index) => probit((index + random.uniform()) / count));
  return random.shuffle(deviates);
}

/** ln of median and third quartile of the values themselves: between two values the mean is taken unlogged. */
function logQuartilesOf(logValues: readonly number[]): DemoQuartiles {
  const sorted = logValues.map((value) => Math.exp(value)).sort((a, b) => a - b);
  return { median: Math.log(quantileSorted(sorted, 0.5)), p75: Math.log(quantileSorted(sorted, 0.75)) };
}

/**
 * Finds the strength (0.05 to 3) of the free spread with which the log values' upper half has the
 * wanted width, then moves them onto the wanted median. Effects of operators, machines and patient
 * size keep their exact ratios: only what is left to chance is stretched.
 */
function fitLogValues(compose: (strength: number) => number[], target: DemoQuartiles): number[] {
  const wanted = Math.log(target.p75 / target.median);
  let low = 0.05;
  let high = 3;
  for (let step = 0; step < 40; step++) {
    const middle = (low + high) / 2;
    const { median, p75 } = logQuartilesOf(compose(middle));
    if (p75 - median < wanted) low = middle;
    else high = middle;
  }
  const values = compose(low);
  const shift = Math.log(target.median) - logQuartilesOf(values).median;
  return values.map((value) => value + shift);
}

/** Beyond an extreme, the log grows at this share only: nobody irradiates for five hours on end. */
const tailShare = 0.4;
const extremeTimeS = 9000;
const extremeKermaGy = 9;

const compressTail = (logValue: number, logExtreme: number): number =>
  logValue <= logExtreme ? logValue : logExtreme + tailShare * (logValue - logExtreme);

/** ln of what patient size, operator and machine do to the kerma rate of one procedure. */
function kermaRateEffect(type: DemoProcedureType, booking: DemoBooking): number {
  const size = type.bodyRegion === 'head' ? 0 : 0.045 * (booking.bodyMassIndex - 27.5);
  const isNewMachine = type.room === 'IR2' && booking.month >= replacementMonth;
  return (
    size +
    Math.log(kermaRateFactor(booking.operatorCode, booking.month)) +
    (isNewMachine ? Math.log(replacementRateFactor) : 0)
  );
}

/**
 * Fluoroscopy time, K a,r and P KA of every booking of one type, log-normal with the type's median
 * and third quartile by construction. P KA follows K a,r through a mean field area that shrinks a
 * little as kerma grows, as much as the two published quartile ratios ask for.
 */
export function drawTotals(type: DemoProcedureType, bookings: readonly DemoBooking[]): DemoTotals[] {
  const count = bookings.length;
  const timeZ = stratifiedNormals(count, 'time', type.key);
  const ownKermaZ = stratifiedNormals(count, 'kerma', type.key);
  const areaZ = stratifiedNormals(count, 'area', type.key);
  const timeEffects = bookings.map((booking) =>
    Math.log(fluoroscopyTimeFactor(booking.operatorCode, booking.month)),
  );
  const timeSigma = logSigma(type.fluoroscopyTimeMin);
  const logTime = fitLogValues(
    (strength) => timeEffects.map((effect, i) => effect + strength * timeSigma * (timeZ[i] ?? 0)),
    type.fluoroscopyTimeMin,
  );
  const kermaSigma = logSigma(type.referenceAirKermaMGy);
  const ownShare = Math.sqrt(1 - timeKermaCorrelation ** 2);
  const kermaZ = ownKermaZ.map((z, i) => timeKermaCorrelation * (timeZ[i] ?? 0) + ownShare * z);
  const logKerma = fitLogValues(
    (strength) =>
      bookings.map(
        (booking, i) =>
          (timeEffects[i] ?? 0) + kermaRateEffect(type, booking) + strength * kermaSigma * (kermaZ[i] ?? 0),
      ),
    type.referenceAirKermaMGy,
  );
  const logProduct = fitLogValues(
    (strength) => logKerma.map((value, i) => strength * value + fieldAreaLogSigma * (areaZ[i] ?? 0)),
    type.kermaAreaProductGyCm2,
  );
  return bookings.map((_, i) => {
    const logKermaMGy = logKerma[i] ?? 0;
    const fieldAreaCm2 = Math.exp((logProduct[i] ?? 0) - logKermaMGy) * 1000;
    const referenceAirKermaGy = Math.exp(compressTail(logKermaMGy, Math.log(1000 * extremeKermaGy))) / 1000;
    const logTimeS = Math.log(60) + (logTime[i] ?? 0);
    return {
      fluoroscopyTimeS: Math.max(3, Math.exp(compressTail(logTimeS, Math.log(extremeTimeS)))),
      referenceAirKermaGy,
      kermaAreaProductGyCm2: referenceAirKermaGy * Math.min(560, Math.max(4, fieldAreaCm2)),
    };
  });
}
