import type { PositionPreset } from '../../shared/contract/record';
import type { DemoBooking, DemoGarment, DemoPresence, DemoProcedureType } from './demo-types';
import { demoGarments } from './garments';
import { createRandom, type Random } from './random';

type Place = Pick<DemoPresence, 'fluoroscopyPreset' | 'acquisitionPreset' | 'hasMobileScreen'>;

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
  NR1: ['N-01', 'N-02', 'N-03', 'N-04'],
  IR1: ['N-02', 'N-03', 'N-04', 'N-05'],
  IR2: ['N-04', 'N-05', 'N-06', 'N-01'],
  CL1: ['N-05', 'N-06', 'N-07', 'N-08', 'N-03'],
} as const;
const anaesthetists = ['A-01', 'A-02', 'A-03', 'A-04'] as const;

/** How often a nurse is scrubbed in; a short radial case or a central line is done without. Invented. */
const scrubShare = (typeKey: string): number => (typeKey === 'IR-CVC' ? 0 : typeKey === 'CA-DX' ? 0.5 : 0.75);

/** The two mobile screens stand in the neuro room and the catheter laboratory. */
const hasMobileScreens = (room: DemoProcedureType['room']): boolean => room === 'NR1' || room === 'CL1';

/** IC-2 is careless about the ceiling screen and about stepping back. */
const screenShare = (staffCode: string): number => (staffCode === 'IC-2' ? 0.78 : 0.93);

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
    hasCeilingScreen:
      isAtTable && place.fluoroscopyPreset !== 'left-chest' && random.chance(screenShare(staffCode)),
    hasTableSkirt: isAtTable && random.chance(0.9),
    hasMobileScreen: place.hasMobileScreen && random.chance(0.7),
  };
}

/** Where somebody stands during acquisitions: behind the barrier, a step back, or where they were. */
function placeFor(
  preset: PositionPreset,
  staffCode: string,
  setting: { room: DemoProcedureType['room']; isTeamSteppingBack: boolean },
  random: Random,
): Place {
  const { room, isTeamSteppingBack } = setting;
  const isOperator = preset === 'operator';
  const stepsBack = isTeamSteppingBack || (!isOperator && preset !== 'second-operator' && random.chance(0.6));
  const isOnExtension = isOperator && room === 'CL1' && random.chance(staffCode === 'IC-2' ? 0.15 : 0.5);
  return {
    fluoroscopyPreset: preset,
    acquisitionPreset: stepsBack ? 'control-room' : isOnExtension ? 'second-operator' : preset,
    hasMobileScreen: hasMobileScreens(room) && (preset === 'scrub' || preset === 'anaesthesia'),
  };
}

/**
 * Who was in the room, where, and wearing what. In subtraction runs most people leave the room, in
 * cine runs some take a step back: the acquisition's place differs from that of fluoroscopy.
 */
export function staffInRoom(type: DemoProcedureType, booking: DemoBooking): DemoPresence[] {
  const random = createRandom('staff', booking.typeKey, booking.index);
  const setting = { room: type.room, isTeamSteppingBack: type.room !== 'CL1' && random.chance(0.65) };
  const staff: DemoPresence[] = [];
  const add = (staffCode: string | null | undefined, duty: DemoPresence['duty'], preset: PositionPreset) => {
    if (staffCode) staff.push(wear(staffCode, duty, placeFor(preset, staffCode, setting, random), random));
  };
  const [scrub, circulating] = random.shuffle(nursesOf[type.room]);
  const needsAnaesthesia = random.chance(anaesthesiaShare[type.key] ?? 0.02);
  add(booking.operatorCode, 'primary-operator', type.operatorPosition);
  add(booking.secondOperatorCode, 'second-operator', 'second-operator');
  add(booking.traineeCode, 'trainee', 'second-operator');
  if (random.chance(scrubShare(type.key))) add(scrub, 'scrub', 'scrub');
  if (random.chance(type.room === 'CL1' ? 0.8 : 0.6)) add(circulating, 'circulating', 'circulating');
  if (needsAnaesthesia) add(random.pick(anaesthetists), 'anaesthesia', 'anaesthesia');
  const technologistPreset = random.chance(0.55) ? 'technologist' : 'control-room';
  add(random.pick(technologistsOf[type.room]), 'technologist', technologistPreset);
  return staff;
}
