import type { StaffExposure, StaffExposures } from '../../shared/contract/staff-exposure';
import { missingPartNames } from '../../shared/contract/record';
import type { Garment } from '../garments/garment.entity';
import { scopeOf } from '../../shared/permissions';
import type { Db } from '../db/db';
import type { Actor } from '../kernel/actor';
import { listChoices } from '../people/person.store';
import { listEventFigures } from '../procedures/irradiation-event.store';
import { listPresences } from '../procedures/presence.store';
import type { Presence } from '../procedures/presence.entity';
import type { Procedure } from '../procedures/procedure.entity';
import { gradeOf, toEstimateRows } from './estimate-rows';
import { readRegisters } from './registers.store';
import type { StaffEstimate } from './staff-estimate.entity';
import { listEstimates } from './staff-estimate.store';

/** Draws behind the interval that the page of one procedure shows. */
const draws = 2000;

const figure = (nominal: number | null, low: number | null, high: number | null) =>
  nominal === null || low === null || high === null ? null : { nominal, low, high };

const figuresOf = (row: StaffEstimate) => ({
  collarAirKermaUGy: figure(row.collarAirKermaUGy, row.collarAirKermaLowUGy, row.collarAirKermaHighUGy),
  eyeAirKermaUGy: figure(row.eyeAirKermaUGy, row.eyeAirKermaLowUGy, row.eyeAirKermaHighUGy),
  waistAirKermaUGy: figure(row.waistAirKermaUGy, row.waistAirKermaLowUGy, row.waistAirKermaHighUGy),
  collarHp10USv: figure(row.collarHp10USv, row.collarHp10LowUSv, row.collarHp10HighUSv),
  eyeHp3USv: figure(row.eyeHp3USv, row.eyeHp3LowUSv, row.eyeHp3HighUSv),
  underGarmentHp10USv: figure(
    row.underGarmentHp10USv,
    row.underGarmentHp10LowUSv,
    row.underGarmentHp10HighUSv,
  ),
  effectiveDoseUSv: figure(row.effectiveDoseUSv, row.effectiveDoseLowUSv, row.effectiveDoseHighUSv),
});

const answers: Record<Presence['garmentAnswer'], string | null> = {
  worn: null,
  none: 'no garment',
  unknown: 'garment not known',
  unanswered: 'garment not answered',
};

function labelGarment(presence: Presence, garment: Garment | undefined): string | null {
  if (!garment) return answers[presence.garmentAnswer];
  const lead = [garment.frontLeadMm, garment.backLeadMm]
    .filter((mm) => mm !== null)
    .map((mm) => mm.toFixed(2));
  return `${garment.code} · ${lead.join(' / ')} mm Pb${garment.isMeasured ? '' : ' (labelled)'}`;
}

const shieldsOf = (presence: Presence) =>
  (
    [
      ['thyroid collar', presence.hasThyroidCollar],
      ['glasses', presence.hasGlasses],
      ['ceiling screen', presence.hasCeilingScreen],
      ['table skirt', presence.hasTableSkirt],
      ['mobile screen', presence.hasMobileScreen],
      ['turned away', presence.isTurnedAway],
    ] as const
  ).flatMap(([label, isThere]) => (isThere ? [label] : []));

function whyNone(procedure: Procedure): StaffExposures['notEstimable'] {
  if (procedure.recordState === 'incomplete')
    return {
      code: 'record-incomplete',
      detail: `The record lacks ${procedure.missing.map((part) => missingPartNames[part]).join(', ')}: no estimate before it is complete.`,
    };
  return null;
}

/**
 * What reached each person in a procedure. Nominal figures are the stored ones; the interval comes from draws on opening.
 * Who sees people by job title gets no names but their own; who sees their own gets others by job, or not at all.
 */
export async function describeExposures(db: Db, actor: Actor, procedure: Procedure): Promise<StaffExposures> {
  const stored = await listEstimates(db, procedure.id, procedure.estimateRevision);
  if (stored.length === 0) return { items: [], notEstimable: whyNone(procedure) };
  const presences = await listPresences(db, procedure.id, procedure.recordRevision);
  const registers = await readRegisters(db, procedure.hospitalId);
  const people = new Map((await listChoices(db, procedure.hospitalId)).map((person) => [person.id, person]));
  const drawn = toEstimateRows(procedure, await listEventFigures(db, procedure.id), presences, registers, {
    newId: () => '',
    revision: procedure.estimateRevision,
    computedAt: new Date(),
    reason: null,
    draws,
  });
  const seesNames = scopeOf(actor, 'procedure.read-exposure') === 'all';
  const items = stored.flatMap((row): StaffExposure[] => {
    const index = presences.findIndex((presence) => presence.id === row.presenceId);
    const presence = presences[index];
    if (!presence) return [];
    const isOwn = row.personId === actor.id;
    const person = row.personId === null ? null : (people.get(row.personId) ?? null);
    const garment = presence.garmentId === null ? undefined : registers.garments.get(presence.garmentId);
    // The drawn interval stands only around the same nominal: registers may have changed since.
    const fresh = drawn[index];
    const isSame =
      fresh !== undefined &&
      isClose(fresh.collarHp10USv, row.collarHp10USv) &&
      isClose(fresh.effectiveDoseUSv, row.effectiveDoseUSv);
    return [
      {
        id: row.id,
        ...(seesNames || isOwn
          ? { person: person && { id: person.id, name: person.name }, visitorName: presence.visitorName }
          : {}),
        job: person?.job ?? null,
        duty: row.duty,
        isOwn,
        garmentLabel:
          seesNames || isOwn
            ? labelGarment(presence, garment)
            : (labelGarment(presence, garment)?.replace(/^\S+ · /, '') ?? null),
        shieldLabels: shieldsOf(presence),
        evidenceGrade: gradeOf(garment, procedure.localDate),
        garmentConfirmedOn: garment?.lastInspectedOn ?? null,
        ...figuresOf(isSame ? fresh : row),
        fluoroscopyShare: row.fluoroscopyShare,
        contributions: row.contributions,
        gaps: row.gaps,
        warnings: row.warnings,
        method: row.method,
        methodVersion: row.methodVersion,
        scatterModel: row.scatterModel,
        effectiveDoseFormula: row.effectiveDoseFormula,
        intervalMethod: isSame ? 'draws' : 'closed-form',
        computedAt: row.computedAt.toISOString(),
      },
    ];
  });
  return { items, notEstimable: null };
}

const isClose = (a: number | null, b: number | null) =>
  a === null || b === null ? a === b : Math.abs(a - b) <= 1e-9 * Math.max(Math.abs(a), Math.abs(b));
