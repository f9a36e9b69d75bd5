import type { EventBeams } from './event-beams';
import type { Protection } from './exposure-model';
import type { ExposedPerson } from './exposure-types';
import { garmentTransmission } from './garment-transmission';

/**
 * What stands between the scatter and the trunk: the front panel, or the back panel of someone
 * turned away. Turned away without a back panel counts as no garment; an unknown or failed garment
 * allows no statement. `leadMm` is null where no garment applies.
 */
export function protectionOf(person: ExposedPerson): {
  protection: Protection;
  leadMm: number | null;
  isUnprotectedBack: boolean;
} {
  const { garment, isTurnedAway, evidenceGrade } = person;
  if (garment.answer === 'unknown')
    return { protection: 'not-estimable', leadMm: null, isUnprotectedBack: false };
  if (garment.answer === 'none') return { protection: 'unprotected', leadMm: null, isUnprotectedBack: false };
  const leadMm = isTurnedAway ? garment.backLeadMm : garment.frontLeadMm;
  if (leadMm === null || (isTurnedAway && leadMm <= 0)) {
    return { protection: 'unprotected', leadMm: null, isUnprotectedBack: true };
  }
  return {
    protection: evidenceGrade === 'D' ? 'not-estimable' : 'garment',
    leadMm,
    isUnprotectedBack: false,
  };
}

/** The sound garment's transmission for each row of the beams. Equal kVp and copper are read once. */
export function garmentColumn(
  beams: EventBeams,
  leadMm: number,
  garment: ExposedPerson['garment'],
): Float64Array {
  const isLeadFree = garment.answer === 'worn' && garment.isLeadFree;
  const column = new Float64Array(beams.count);
  let [lastKvp, lastCopper, lastTransmission] = [Number.NaN, Number.NaN, 1];
  for (let row = 0; row < beams.count; row += 1) {
    const kvp = beams.kvp[row] ?? 0;
    const copper = beams.copperMm[row] ?? Number.NaN;
    if (kvp !== lastKvp || !Object.is(copper, lastCopper)) {
      const copperMm = Number.isNaN(copper) ? null : copper;
      lastTransmission = garmentTransmission({ kvp, copperMm, leadMm, isLeadFree });
      [lastKvp, lastCopper] = [kvp, copper];
    }
    column[row] = lastTransmission;
  }
  return column;
}
