export type RateBasis = 'irradiation-duration' | 'exposure-time' | 'kerma-area-product';
export type AirKermaRate = { perS: number; basis: RateBasis };

type RatedEvent = {
  referenceAirKermaGy: number | null;
  kermaAreaProductGyCm2: number | null;
  irradiationDurationS: number | null;
  exposureTimeS: number | null;
};

/**
 * Mean rate of one irradiation event: reference air kerma over the irradiation duration (wall clock), else over the
 * exposure time (beam on), in Gy/s; where the event has no air kerma, kerma-area product over time, in Gy·cm²/s.
 * Null where nothing can be divided.
 *
 * Known value: 0.012 Gy in 6 s is 0.002 Gy/s.
 */
export function airKermaRate(event: RatedEvent): AirKermaRate | null {
  const isDuration = event.irradiationDurationS !== null && event.irradiationDurationS > 0;
  const timeS = isDuration ? event.irradiationDurationS : event.exposureTimeS;
  if (timeS === null || timeS <= 0) return null;
  if (event.referenceAirKermaGy !== null)
    return {
      perS: event.referenceAirKermaGy / timeS,
      basis: isDuration ? 'irradiation-duration' : 'exposure-time',
    };
  if (event.kermaAreaProductGyCm2 !== null)
    return { perS: event.kermaAreaProductGyCm2 / timeS, basis: 'kerma-area-product' };
  return null;
}
