import { kapWeightedKvp } from '../../shared/dosimetry/kap-weighted-kvp';
import { checkData, isKeptOut, settledFiguresOf } from '../data-checks/check-data';
import { buildStrip } from './build-strip';
import { countFigures } from './count-figures';
import { judgeAttention, type Attention } from './judge-attention';
import { placeInTime, type PlacedInTime } from './place-in-time';
import type { Procedure } from './procedure.entity';
import type { SummaryInput } from './summary-input';
import { totalPlanes } from './total-planes';
import { totalTogether } from './total-together';

export type Summary = PlacedInTime &
  Attention &
  Pick<
    Procedure,
    | 'fluoroscopyTimeS'
    | 'referenceAirKermaGy'
    | 'displayedReferenceAirKermaGy'
    | 'isReferenceAirKermaUpperBound'
    | 'kermaAreaProductGyCm2'
    | 'displayedKermaAreaProductGyCm2'
    | 'isCorrected'
    | 'kvpMean'
    | 'eventCount'
    | 'strip'
    | 'planes'
    | 'dataChecks'
    | 'settledFigures'
    | 'isQuarantined'
  >;

/** Everything a procedure's row holds of its reports and events, recomputed from all of them; pure. */
export function summariseProcedure(input: SummaryInput): Summary {
  const when = placeInTime(input);
  const planes = totalPlanes(input, when.localDate);
  const together = totalTogether(planes, input.procedure.fieldsOverlap);
  const dataChecks = checkData({ input, planes, together }, input.checking);
  const settledFigures = settledFiguresOf(dataChecks, input.checking);
  return {
    ...when,
    ...countFigures(together, settledFigures),
    displayedReferenceAirKermaGy: together.referenceAirKerma.displayed,
    isReferenceAirKermaUpperBound: together.isUpperBound,
    displayedKermaAreaProductGyCm2: together.kermaAreaProduct.displayed,
    kvpMean: kapWeightedKvp(
      input.events.map((event) => ({
        kvp: event.kvpMean,
        kermaAreaProductGyCm2: event.kermaAreaProductGyCm2,
      })),
    ),
    eventCount: input.events.length,
    strip: buildStrip(input.events),
    planes,
    dataChecks,
    settledFigures,
    isQuarantined: isKeptOut(dataChecks, input.checking),
    ...judgeAttention(input, together, dataChecks, settledFigures),
  };
}
