/**
 * mGy per mA·s at a distance from the focus, tungsten tube with about 3 mm Al: 0.1 mGy at 1 m and
 * 80 kV, rising with kVp^2.3 and weakened by copper. Rough figures of the trade, from memory; they
 * only have to make generated tube currents believable.
 */
export function tubeOutputMGyPerMas(kvp: number, copperMm: number, distanceMm: number): number {
  const copperTransmission = 1 / (1 + 4.4 * copperMm + 2.2 * copperMm ** 2);
  return (0.1 * (kvp / 80) ** 2.3 * copperTransmission) / (distanceMm / 1000) ** 2;
}

/**
 * Current and pulse width that would give an event's air kerma. The width is kept where the current
 * stays within 3 to 900 mA, else it gives way within 1 to 200 ms.
 */
export function chooseTubeLoad(
  event: {
    referenceAirKermaGy: number;
    pulseCount: number;
    kvp: number;
    copperMm: number;
    referenceDistanceMm: number;
  },
  wantedPulseWidthMs: number,
): { tubeCurrentMa: number; pulseWidthMs: number } {
  const output = tubeOutputMGyPerMas(event.kvp, event.copperMm, event.referenceDistanceMm);
  const masPerPulse = (1000 * event.referenceAirKermaGy) / output / event.pulseCount;
  const wantedMa = (1000 * masPerPulse) / wantedPulseWidthMs;
  const tubeCurrentMa = Math.min(900, Math.max(3, wantedMa));
  const pulseWidthMs = Math.min(200, Math.max(1, (1000 * masPerPulse) / tubeCurrentMa));
  return { tubeCurrentMa: Number(tubeCurrentMa.toFixed(1)), pulseWidthMs: Number(pulseWidthMs.toFixed(1)) };
}
