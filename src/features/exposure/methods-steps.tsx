import { estimateMethod, estimateMethodVersion } from '../../../shared/dosimetry/estimate-staff-exposure';
import { Section } from '../../ui/margin-note';
import { QuantitySign } from '../../ui/quantity-sign';

const steps = [
  {
    name: 'Beam',
    text: 'KAP of the event as the machine displays it, times the physicist’s dated factor where one holds. kVp: the mean of the event’s values; where none is given, the median of the procedure type, else 80 kV, and said.',
  },
  {
    name: 'Geometry',
    text: 'The C-arm’s angles give the beam’s direction, place and stature give the body points; patient position (head or feet first, supine or prone), access side and a tube over the table turn the picture. Rotational runs are summed along their path.',
  },
  {
    name: 'Scatter',
    text: 'K = S(θ, kVp) · KAP / d² at eye, collar, chest, waist and lower leg, apart for the places during fluoroscopy and acquisitions.',
  },
  {
    name: 'Shields',
    text: 'Screens act on the body points behind them; the garment’s lead lets the share T of the scatter through at the event’s kVp. A failed garment allows no statement about the body behind it.',
  },
  {
    name: 'Quantities',
    text: 'Hp(10) at the collar, Hp(3) at the eye, Hp(10) under the garment, and an effective dose by a named formula. Sums run over the events.',
  },
  {
    name: 'Interval',
    text: 'About 95 %, from every uncertain input; closed form, and 2 000 draws when a procedure is opened. A correction of the record adds a new estimate; earlier ones stay readable.',
  },
];

/** How an estimate is made, in six steps. */
export const MethodsSteps = () => (
  <Section title="How a staff estimate is made" note={`${estimateMethod}, version ${estimateMethodVersion}`}>
    <p className="border-y border-rule bg-surface px-3 py-2.5 font-medium">
      <QuantitySign of="scatterAirKerma" /> = Σ S(θ, kVp) · <QuantitySign of="kermaAreaProduct" /> / d², over
      all irradiation events of a procedure
    </p>
    <ol className="grid max-w-[62rem] gap-x-8 gap-y-3 md:grid-cols-2">
      {steps.map(({ name, text }, place) => (
        <li key={name} className="border-t border-rule pt-2">
          <span className="font-semibold">
            {place + 1}. {name}.
          </span>{' '}
          <span className="text-ink-2">{text}</span>
        </li>
      ))}
    </ol>
  </Section>
);
