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

/**
 * Gives the sound garment's transmission for each row of the beams, reading each lead thickness and
 * material once however many persons wear it.
 */
export function createGarmentColumns(beams: EventBeams) {
  const known = new Map<string, Float64Array>();
  return (leadMm: number, garment: ExposedPerson['garment']): Float64Array => {
    const isLeadFree = garment.answer === 'worn' && garment.isLeadFree;
    const key = `${leadMm} ${isLeadFree}`;
    const column = known.get(key) ?? garmentColumn(beams, leadMm, isLeadFree);
    known.set(key, column);
    return column;
  };
}

function garmentColumn(beams: EventBeams, leadMm: number, isLeadFree: boolean): Float64Array {
  return Float64Array.from({ length: beams.count }, (_, row) => {
    const copper = beams.copperMm[row] ?? Number.NaN;
    const copperMm = Number.isNaN(copper) ? null : copper;
    return garmentTransmission({ kvp: beams.kvp[row] ?? 0, copperMm, leadMm, isLeadFree });
  });
}
