import type { ConflictSide, ReportConflict } from '../../../shared/contract/decide-report';
import {
  formatFluoroscopyTime,
  formatInteger,
  formatKermaAreaProduct,
  formatReferenceAirKerma,
  MISSING,
} from '../../../shared/units';
import { formatDateTime, formatInstant, formatTimeWithSeconds } from '../../lib/clock';

export type ComparedRow = { name: string; stored: string; held: string };

const planeNames = { single: '', A: ', plane A', B: ', plane B', all: ', all planes' };

function timesOf({ firstEventAt, lastEventAt }: ConflictSide): string {
  if (!firstEventAt || !lastEventAt) return MISSING;
  return `${formatDateTime(firstEventAt)} to ${formatTimeWithSeconds(lastEventAt)}`;
}

type PlaneTotals = ConflictSide['planes'][number];
const withUnit = (text: string, unit: string) => (text === MISSING ? text : `${text} ${unit}`);

const totalRows: { name: string; show: (plane: PlaneTotals) => string }[] = [
  { name: 'FT', show: (plane) => withUnit(formatFluoroscopyTime(plane.fluoroscopyTimeS), 'min') },
  {
    name: 'K a,r',
    show: ({ referenceAirKermaGy }) => {
      const { value, unit } = formatReferenceAirKerma(referenceAirKermaGy);
      return withUnit(value, unit);
    },
  },
  {
    name: 'P KA',
    show: (plane) => withUnit(formatKermaAreaProduct(plane.kermaAreaProductGyCm2), 'Gy·cm²'),
  },
];

/** What two reports of one identity say, line by line; equal lines stay, so that it is seen that they are equal. */
export function compareSides({ stored, held }: ReportConflict, timeZone: string): ComparedRow[] {
  const line = (name: string, show: (side: ConflictSide) => string): ComparedRow => ({
    name,
    stored: stored ? show(stored) : MISSING,
    held: show(held),
  });
  const planes = [...new Set([...(stored?.planes ?? []), ...held.planes].map(({ plane }) => plane))];
  const totals = planes.flatMap((plane) =>
    totalRows.map(({ name, show }) =>
      line(`${name}${plane ? planeNames[plane] : ''}`, ({ planes: own }) => {
        const found = own.find((one) => one.plane === plane);
        return found ? show(found) : MISSING;
      }),
    ),
  );
  return [
    line('File', ({ fileName }) => fileName),
    line('Received', ({ receivedAt }) => formatInstant(receivedAt, timeZone)),
    line('Written by the machine', ({ contentAt }) => (contentAt ? formatDateTime(contentAt) : MISSING)),
    line('Machine', ({ machine }) => machine ?? MISSING),
    line('Says of itself', ({ isPartial }) => (isPartial ? 'partial' : 'complete')),
    line('Exposures', ({ eventCount, ownEventCount }) =>
      ownEventCount === 0 || !stored
        ? formatInteger(eventCount)
        : `${formatInteger(eventCount)}, ${formatInteger(ownEventCount)} of them only here`,
    ),
    line('First to last exposure', timesOf),
    ...totals,
  ];
}

/** What a person must know before deciding, in sentences. */
export function describeConflict({
  isSamePatient,
  isSameStudy,
  changedEventCount,
  stored,
}: ReportConflict): string[] {
  if (!stored) return ['No report of this identity counts now.'];
  const belonging =
    isSamePatient === false
      ? 'The two name different patients: put in place, this one goes to a procedure of its own patient.'
      : isSameStudy === false
        ? 'The two belong to different studies: put in place, this one goes to the procedure of its study.'
        : 'Both belong to the same study of the same patient.';
  const changed =
    changedEventCount === 0
      ? 'Exposures that both have carry the same figures.'
      : `${changedEventCount === 1 ? '1 exposure that both have carries' : `${changedEventCount} exposures that both have carry`} other figures in the two.`;
  return [belonging, changed];
}
