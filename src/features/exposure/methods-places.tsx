import {
  bodyPoints,
  bodyPointShares,
  bodyPointZM,
  defaultStatureM,
  isocentreHeightM,
} from '../../../shared/dosimetry/body-points';
import { positionPresets, type PositionPreset } from '../../../shared/dosimetry/room-positions';
import { positionPresetNames } from '../../../shared/contract/record';
import { formatMetres } from '../../../shared/units';
import { DataTable } from '../../ui/data-table';
import { Section } from '../../ui/margin-note';
import { RoomPlan } from './room-plan';

const pointNames = { eye: 'Eye', collar: 'Collar', chest: 'Chest', waist: 'Waist', lowerLeg: 'Lower leg' };
const places = Object.entries(positionPresets) as [
  PositionPreset,
  (typeof positionPresets)[PositionPreset],
][];

/** The usual places in the room and the heights of the body points. */
export const MethodsPlaces = () => (
  <Section title="Places in the room" note="metres from the isocentre; editable in every record">
    <div className="grid gap-x-8 gap-y-4 lg:grid-cols-2">
      <RoomPlan />
      <DataTable
        caption="Usual places"
        rows={places}
        rowKey={([preset]) => preset}
        hasStickyHead={false}
        columns={[
          { key: 'name', head: 'Place', phone: 'title', cell: ([preset]) => positionPresetNames[preset] },
          {
            key: 'x',
            head: 'x, patient’s left',
            unit: 'm',
            align: 'end',
            cell: ([, { xM, isBehindBarrier }]) =>
              isBehindBarrier ? 'behind the barrier' : formatMetres(xM),
          },
          {
            key: 'y',
            head: 'y, head',
            unit: 'm',
            align: 'end',
            cell: ([, { yM, isBehindBarrier }]) => (isBehindBarrier ? 'counts as 0' : formatMetres(yM)),
          },
        ]}
      />
    </div>
    <DataTable
      caption="Body points"
      rows={bodyPoints}
      rowKey={String}
      hasStickyHead={false}
      columns={[
        { key: 'name', head: 'Body point', phone: 'title', cell: (point) => pointNames[point] },
        { key: 'share', head: 'Share of stature', align: 'end', cell: (point) => bodyPointShares[point] },
        {
          key: 'z',
          head: `Above the isocentre at ${formatMetres(defaultStatureM)} m`,
          unit: 'm',
          align: 'end',
          cell: (point) => formatMetres(bodyPointZM(point, defaultStatureM)),
        },
      ]}
    />
    <p className="max-w-[44rem] text-sm text-ink-2">
      The isocentre lies {formatMetres(isocentreHeightM)} m above the floor. With access from the patient’s
      left, everybody at the table stands mirrored. All of these are our choices.
    </p>
  </Section>
);
