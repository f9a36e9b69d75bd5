/**
 * Mean kVp of a procedure weighted by each event's KAP: Σ(kVp·KAP)/ΣKAP, kV. Events without kVp or
 * KAP are left out; null where no weight remains.
 *
 * Known value: 70 kV with 10 Gy·cm² and 90 kV with 30: 85.
 */
export function kapWeightedKvp(
  events: readonly { kvp: number | null; kermaAreaProductGyCm2: number | null }[],
): number | null {
  let weighted = 0;
  let weight = 0;
  for (const { kvp, kermaAreaProductGyCm2 } of events) {
    if (kvp === null || kermaAreaProductGyCm2 === null) continue;
    weighted += kvp * kermaAreaProductGyCm2;
    weight += kermaAreaProductGyCm2;
  }
  return weight > 0 ? weighted / weight : null;
}
