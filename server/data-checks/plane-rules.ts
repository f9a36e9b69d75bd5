import type { PlaneTotals } from '../../shared/contract/procedure';
import {
  found,
  kermaQuantities,
  notChecked,
  passed,
  practice,
  writePercent,
  type CheckRule,
} from './check-rule';

const planeSum: CheckRule = {
  code: 'plane-sum',
  name: 'Total of all planes',
  looksAt: 'A reported total of all planes against the sum of the planes it reports apart.',
  remedy: 'Look which of the two the machine’s screen shows; the planes count here.',
  source: practice,
  severity: 'note',
  owner: 'physicist',
  low: null,
  high: 5,
  unit: '%',
  check({ input }, { high }) {
    const shares = input.reports.flatMap(({ reportedPlanes }) => {
      const whole = reportedPlanes.find(({ plane }) => plane === 'all');
      const parts = reportedPlanes.filter(({ plane }) => plane !== 'all' && plane !== null);
      if (!whole || parts.length === 0) return [];
      return kermaQuantities.flatMap(({ field, sign }) => {
        const sum = parts.reduce((total, part) => total + (part[field] ?? 0), 0);
        const total = whole[field];
        return total === null || sum <= 0 ? [] : [{ field, sign, share: Math.abs(total - sum) / sum }];
      });
    });
    const largest = shares.toSorted((a, b) => b.share - a.share)[0];
    if (!largest) return notChecked('The report gives no total of all planes beside the planes.');
    return high !== null && largest.share * 100 > high
      ? found(
          `The total of all planes and the sum of planes differ by ${writePercent(largest.share)} in ${largest.sign}`,
          largest.field,
          largest.share,
        )
      : passed('The total of all planes is the sum of the planes');
  },
};

const planesAlike: CheckRule = {
  code: 'planes-alike',
  name: 'Two planes with one total',
  looksAt:
    'Whether two planes of a machine report the very same K a,r and P KA, which their events do not bear out.',
  remedy: 'One total was probably written twice: type the true total.',
  source: practice,
  severity: 'hard',
  owner: 'physicist',
  low: null,
  high: null,
  unit: null,
  check({ planes }) {
    const reported = planes.filter(({ reported: total }) => (total?.referenceAirKermaGy ?? 0) > 0);
    if (reported.length < 2) return notChecked('One plane only.');
    const bearsOut = ({ reported: total, summed }: PlaneTotals) =>
      summed.referenceAirKermaGy !== null &&
      Math.abs(summed.referenceAirKermaGy / (total?.referenceAirKermaGy ?? 1) - 1) < 0.05;
    const twin = reported.find((one, place) =>
      reported
        .slice(place + 1)
        .some(
          (other) =>
            one.equipmentId === other.equipmentId &&
            one.reported?.referenceAirKermaGy === other.reported?.referenceAirKermaGy &&
            one.reported?.kermaAreaProductGyCm2 === other.reported?.kermaAreaProductGyCm2 &&
            !(bearsOut(one) && bearsOut(other)),
        ),
    );
    return twin
      ? found(
          'Two planes report the very same totals: written twice?',
          twin.reported?.referenceAirKermaGy ?? 0,
        )
      : passed('The planes have totals of their own');
  },
};

export const planeRules: CheckRule[] = [planeSum, planesAlike];
