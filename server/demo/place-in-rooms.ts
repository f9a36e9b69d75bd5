import type { DemoBooking, DemoTotals } from './demo-types';
import { findProcedureType } from './hospital';
import { createRandom, type Random } from './random';
import { imagingPlans } from './techniques.table-data';

/** A booking with its minutes after local midnight and the time from first to last irradiation. */
export interface PlacedBooking {
  booking: DemoBooking;
  totals: DemoTotals;
  startMin: number;
  spanMin: number;
}

const openingMin = 7.5 * 60;
const closingMin = 17.5 * 60;
/** Room time before the first irradiation. */
const turnoverMin = 22;

function drawSpanMin({ typeKey, index }: DemoBooking, totals: DemoTotals): number {
  const random = createRandom('span', typeKey, index);
  const base = imagingPlans[typeKey]?.baseDurationMin ?? 20;
  const spread = Math.exp(0.2 * random.normal());
  return spread * (0.7 * base + 1.6 * (totals.fluoroscopyTimeS / 60));
}

/** Slots one after another between opening and closing; spare time falls between them at random. */
function placeRegular(slots: Omit<PlacedBooking, 'startMin'>[], random: Random): PlacedBooking[] {
  const busyMin = slots.reduce((sum, slot) => sum + slot.spanMin + turnoverMin, 0);
  const spareMin = Math.max(0, closingMin - openingMin - busyMin);
  // Sorted uniform cuts share out the spare minutes; an overfull day works through without pauses.
  const cuts = slots.map(() => random.uniform() * spareMin).sort((a, b) => a - b);
  const stretch = Math.min(1, (closingMin - openingMin) / busyMin);
  let elapsed = 0;
  return slots.map((slot, index) => {
    const startMin = openingMin + (cuts[index] ?? 0) + stretch * (elapsed + turnoverMin);
    elapsed += slot.spanMin + turnoverMin;
    return { ...slot, startMin };
  });
}

function placeOutOfHours(slot: Omit<PlacedBooking, 'startMin'>): PlacedBooking {
  const { typeKey, index, day } = slot.booking;
  const random = createRandom('night', typeKey, index);
  const weekday = new Date(`${day}T12:00:00Z`).getUTCDay();
  if (weekday === 0 || weekday === 6) return { ...slot, startMin: random.between(6 * 60, 23.5 * 60) };
  const startMin = random.chance(0.7)
    ? random.between(closingMin + 60, 23.8 * 60)
    : random.between(10, openingMin - 75);
  return { ...slot, startMin };
}

/** Gives every booking its time of day, room by room and day by day. */
export function placeInRooms(
  planned: readonly { booking: DemoBooking; totals: DemoTotals }[],
): PlacedBooking[] {
  const roomDays = new Map<string, Omit<PlacedBooking, 'startMin'>[]>();
  for (const { booking, totals } of planned) {
    const key = `${findProcedureType(booking.typeKey).room}/${booking.day}`;
    const slots = roomDays.get(key) ?? [];
    slots.push({ booking, totals, spanMin: drawSpanMin(booking, totals) });
    roomDays.set(key, slots);
  }
  return [...roomDays].flatMap(([key, slots]) => {
    const random = createRandom('room-day', key);
    const regular = random.shuffle(slots.filter((slot) => !slot.booking.isOutOfHours));
    return [
      ...placeRegular(regular, random),
      ...slots.filter((slot) => slot.booking.isOutOfHours).map(placeOutOfHours),
    ];
  });
}
