import type { DemoBooking, DemoGarment, DemoPresence, DemoProcedureType } from './demo-types';
import { demoGarments } from './garments';
import { createRandom, type Random } from './random';

type Place = Pick<DemoPresence, 'fluoroscopyPreset' | 'acquisitionPreset'>;

const isInService = (garment: DemoGarment) => garment.state === 'in-service';
const ownersOf = (kind: DemoGarment['kind']) =>
  new Set(
    demoGarments.filter((garment) => garment.kind === kind && isInService(garment)).map((g) => g.ownerCode),
  );
const collarOwners = ownersOf('thyroid-collar');
const glassesOwners = ownersOf('glasses');
const apronByOwner = new Map(
  demoGarments
    .filter(
      (garment) =>
        (garment.kind === 'vest-and-skirt' || garment.kind === 'one-piece') && isInService(garment),
    )
    .map((garment) => [garment.ownerCode, garment.code]),
);

/** How often an anaesthetist is in the room. Invented. */
const anaesthesiaShare: Readonly<Record<string, number>> = {
  'NEU-ANE': 1,
  'NEU-AVM': 1,
  'NEU-THR': 0.8,
  'IR-TIPS': 0.9,
  'CA-TAVI': 0.9,
  'CA-AFA': 0.8,
  'CA-PM': 0.15,
  'IR-PTBD': 0.2,
};

/** Each room has its own crews, so that people's exposure differs. */
const technologistsOf = {
  NR1: ['T-01', 'T-02', 'T-03'],
  IR1: ['T-03', 'T-04', 'T-05'],
  IR2: ['T-05', 'T-06', 'T-07'],
  CL1: ['T-08', 'T-09', 'T-10', 'T-04'],
} as const;
const nursesOf = {
  NR1: ['N-01', 'N-02', 'N-03'],
  IR1: ['N-03', 'N-04', 'N-05'],
  IR2: ['N-04', 'N-05', 'N-06'],
  CL1: ['N-06', 'N-07', 'N-08'],
} as const;
const anaesthetists = ['A-01', 'A-02', 'A-03', 'A-04'] as const;

function wear(staffCode: string, duty: DemoPresence['duty'], place: Place, random: Random): DemoPresence {
  const isBehindBarrier = place.fluoroscopyPreset === 'control-room';
  const garmentCode = apronByOwner.get(staffCode) ?? null;
  const isAtTable = duty === 'primary-operator' || duty === 'second-operator' || duty === 'trainee';
  return {
    staffCode,
    duty,
    ...place,
    garmentCode: isBehindBarrier ? null : garmentCode,
    garmentAnswer: isBehindBarrier ? 'none' : garmentCode ? 'worn' : 'unknown',
    hasThyroidCollar: !isBehindBarrier && collarOwners.has(staffCode),
    hasGlasses: !isBehindBarrier && glassesOwners.has(staffCode) && random.chance(0.85),
    // The pacemaker pocket leaves no room for the ceiling screen.
    hasCeilingScreen: isAtTable && place.fluoroscopyPreset !== 'left-chest' && random.chance(0.8),
    hasTableSkirt: isAtTable && random.chance(0.9),
    hasMobileScreen: duty === 'anaesthesia' && random.chance(0.6),
  };
}

/**
 * Who was in the room, where, and wearing what. In subtraction runs most people step back: the
 * acquisition's place differs from that of fluoroscopy.
 */
export function staffInRoom(type: DemoProcedureType, booking: DemoBooking): DemoPresence[] {
  const random = createRandom('staff', booking.typeKey, booking.index);
  const stepsBack = type.room !== 'CL1' && random.chance(0.65);
  const still = (preset: DemoPresence['fluoroscopyPreset']): Place => ({
    fluoroscopyPreset: preset,
    acquisitionPreset: stepsBack ? 'control-room' : preset,
  });
  const staff = [wear(booking.operatorCode, 'primary-operator', still(type.operatorPosition), random)];
  if (booking.secondOperatorCode)
    staff.push(wear(booking.secondOperatorCode, 'second-operator', still('second-operator'), random));
  if (booking.traineeCode) staff.push(wear(booking.traineeCode, 'trainee', still('second-operator'), random));
  const [scrub, circulating] = random.shuffle(nursesOf[type.room]);
  if (scrub && type.key !== 'IR-CVC') staff.push(wear(scrub, 'scrub', still('scrub'), random));
  if (circulating && random.chance(type.room === 'CL1' ? 0.8 : 0.6))
    staff.push(wear(circulating, 'circulating', still('circulating'), random));
  if (random.chance(anaesthesiaShare[type.key] ?? 0.02))
    staff.push(wear(random.pick(anaesthetists), 'anaesthesia', still('anaesthesia'), random));
  const technologistPlace = still(random.chance(0.55) ? 'technologist' : 'control-room');
  staff.push(wear(random.pick(technologistsOf[type.room]), 'technologist', technologistPlace, random));
  return staff;
}
