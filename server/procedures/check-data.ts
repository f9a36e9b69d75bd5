import type { DataCheck } from '../../shared/contract/data-check';
import type { PlaneTotals } from '../../shared/contract/procedure';
import type { SummaryInput } from './summary-input';
import type { Together } from './total-together';

type Facts = { input: SummaryInput; planes: PlaneTotals[]; together: Together };
type Verdict = Omit<DataCheck, 'code'>;
type Rule = { code: string; check: (facts: Facts) => Verdict };

const passed = (detail: string): Verdict => ({ result: 'passed', detail });
const noted = (detail: string): Verdict => ({ result: 'noted', detail });
const failed = (detail: string): Verdict => ({ result: 'failed', detail });
const notChecked = (detail: string): Verdict => ({ result: 'not-checked', detail });
const percent = (share: number) => `${(share * 100).toFixed(share < 0.1 ? 1 : 0)} %`;

function addsUp({ planes }: Facts): Verdict {
  const quantities = ['kermaAreaProductGyCm2', 'referenceAirKermaGy'] as const;
  const differences = planes.flatMap(({ reported, summed }) =>
    quantities.flatMap((quantity) => {
      const [total, events] = [reported?.[quantity] ?? null, summed[quantity]];
      return total === null || events === null || total === 0 ? [] : [Math.abs(events - total) / total];
    }),
  );
  if (differences.length === 0) return notChecked('Totals or events are missing: nothing to compare.');
  const largest = Math.max(...differences);
  return largest > 0.05
    ? noted(`Events and reported totals differ by ${percent(largest)}`)
    : passed(`Events add up to the totals within ${percent(largest)}`);
}

function isFieldPlausible({ planes }: Facts): Verdict {
  const areas = planes.flatMap(
    ({ displayed: { kermaAreaProductGyCm2: product, referenceAirKermaGy: kerma } }) =>
      product === null || kerma === null || kerma === 0 ? [] : [product / kerma],
  );
  if (areas.length === 0) return notChecked('P KA or K a,r is missing: no mean field area.');
  const odd = areas.find((area) => area < 4 || area > 600);
  return odd === undefined
    ? passed(
        `Mean field area at the reference point ${areas.map((area) => Math.round(area)).join(' and ')} cm²`,
      )
    : failed(
        `Mean field area at the reference point ${Number(odd.toPrecision(3))} cm²: a unit slip? Outside 4 to 600 cm²`,
      );
}

function isKvpPlausible({ input }: Facts): Verdict {
  const values = input.events.flatMap((event) => event.kvpValues);
  if (values.length === 0) return notChecked('No event tells its kVp.');
  const [low, high] = [Math.min(...values), Math.max(...values)];
  const missing = input.events.filter((event) => event.kvpValues.length === 0).length;
  if (low < 40 || high > 125)
    return noted(`kVp from ${Math.round(low)} to ${Math.round(high)}: outside 40 to 125`);
  return missing > 0
    ? noted(`kVp missing in ${missing} of ${input.events.length} events`)
    : passed(`kVp ${Math.round(low)} to ${Math.round(high)}`);
}

function hasTimeForKerma({ together }: Facts): Verdict {
  const time = together.fluoroscopyTimeS;
  const kerma = together.referenceAirKerma.displayed;
  if (time === null || kerma === null) return notChecked('Fluoroscopy time or K a,r is missing.');
  if (kerma === 0 && time > 30) return noted('K a,r is 0 although there was fluoroscopy');
  const ratePerMin = time > 0 ? (kerma * 1000) / (time / 60) : 0;
  return ratePerMin > 600
    ? noted(`K a,r over fluoroscopy time is ${Math.round(ratePerMin)} mGy/min: above 600`)
    : passed('K a,r and fluoroscopy time fit');
}

function isInThePast({ input }: Facts): Verdict {
  const latest = Math.max(...input.events.map((event) => event.startedAt.getTime()), -Infinity);
  if (latest === -Infinity) return notChecked('No event tells when it was.');
  if (latest > input.now.getTime() + 86_400_000)
    return noted('An event lies in the future: check the machine’s clock');
  const first = Math.min(...input.events.map((event) => event.startedAt.getTime()));
  return latest - first > 86_400_000
    ? noted('Events lie more than 24 hours apart')
    : passed('Times are plausible');
}

function isReferencePointUsual({ input }: Facts): Verdict {
  const codes = input.reports.flatMap((report) =>
    report.reportedPlanes.flatMap((plane) => plane.referencePointDefinition?.code?.value ?? []),
  );
  if (codes.length === 0) return notChecked('The report does not say where K a,r is defined.');
  return codes.every((code) => code === '113860')
    ? passed('Reference point 15 cm from the isocentre toward the source')
    : noted('K a,r is defined at another point than 15 cm from the isocentre toward the source');
}

function areUnitsKnown({ input }: Facts): Verdict {
  const unknown = input.reports.flatMap((report) =>
    report.warnings.filter(({ code }) => code.startsWith('unit-')),
  );
  return unknown.length === 0
    ? passed('Every unit is known')
    : failed(`A unit nobody can read: ${unknown[0]?.detail ?? ''}. The value counts as unknown`);
}

/** The named rules, in the order they are shown. Bounds come from practice, from memory, and are the physicist's to change. */
const rules: Rule[] = [
  { code: 'totals-against-events', check: addsUp },
  { code: 'mean-field-area', check: isFieldPlausible },
  { code: 'kvp-range', check: isKvpPlausible },
  { code: 'kerma-against-time', check: hasTimeForKerma },
  { code: 'event-times', check: isInThePast },
  { code: 'reference-point', check: isReferencePointUsual },
  { code: 'units', check: areUnitsKnown },
];

export const checkData = (facts: Facts): DataCheck[] =>
  rules.map(({ code, check }) => ({ code, ...check(facts) }));
