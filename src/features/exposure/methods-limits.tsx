import { Caution } from '../../ui/caution';
import { Section } from '../../ui/margin-note';

const limits: { name: string; text: string }[] = [
  {
    name: 'Forward and to the side, too high',
    text: 'Williams’ fit is conservative below 105°: published measurements beside a coronary phantom lie at about 1.1 µGy/(Gy·cm²) at head height where the fit gives 2.7. The interval reaches down to 0.22 of the figure for that reason.',
  },
  {
    name: 'Behind heavy copper, perhaps too low',
    text: 'Copper in the beam raises the scatter per KAP and hardens it. The transmission of garments is read 10 kV higher from 0.6 mm on; S itself is not raised.',
  },
  {
    name: 'LAO against RAO, contrast too small',
    text: 'The model gives at most a factor of about 4 between mirrored projections; up to 23 has been measured.',
  },
  {
    name: 'Hands',
    text: 'Not modelled: they may reach into the beam. Only a ring dosemeter tells.',
  },
  {
    name: 'Scatter from elsewhere',
    text: 'Walls, table, tube housing and leakage are left out, except that no set of screens counts as better than a factor of 0.02.',
  },
  {
    name: 'People who move',
    text: 'One place for fluoroscopy and one for acquisitions; nobody moves between the events. Rotational runs count only for those who are said to have stayed in the room.',
  },
  {
    name: 'Mirrored access',
    text: 'The other side of the table changes the values by a factor of 2 to 4. Where no access side is recorded, the right side is taken and said.',
  },
  {
    name: 'Only totals known',
    text: 'A procedure without events counts as one event at its KAP-weighted kVp without angles. Without KAP there is no estimate.',
  },
  {
    name: 'Lead-free garments',
    text: 'Equivalence by narrow beam leaves out the garment’s own fluorescence; the factor for it is an average.',
  },
  {
    name: 'Eye values',
    text: 'Published coefficients for Hp(3) at low energies differ more than ours; lead glasses protect less the more the head is turned.',
  },
];

/** What the method does not do, said plainly. */
export const MethodsLimits = () => (
  <Section title="Limits and known biases">
    <dl className="grid max-w-[62rem] gap-x-8 gap-y-3 md:grid-cols-2">
      {limits.map(({ name, text }) => (
        <div key={name} className="border-t border-rule pt-2">
          <dt className="font-semibold">{name}</dt>
          <dd className="text-ink-2">{text}</dd>
        </div>
      ))}
    </dl>
    <Caution of="estimate-not-record" />
    <Caution of="scatter-interval" />
    <Caution of="displayed-tolerance" />
    <Caution of="local-regulation" />
    <Caution of="practitioners-decide" />
  </Section>
);
