import { positionPresets, type PositionPreset } from '../../../shared/dosimetry/room-positions';
import { positionPresetNames } from '../../../shared/contract/record';

const scale = 72;
const box = { left: -1.7, right: 3.5, foot: -3.6, head: 1.8 };
const placeX = (xM: number) => (xM - box.left) * scale;
const placeY = (yM: number) => (box.head - yM) * scale;
const inside = (
  Object.entries(positionPresets) as [PositionPreset, { xM: number; yM: number; isBehindBarrier: boolean }][]
).filter(([, { isBehindBarrier }]) => !isBehindBarrier);
/** Names left of the table end at their dot, so that they do not lie on the patient. */
const isLeft = (xM: number) => xM < 0;

/** The usual places seen from above, head up: the patient's left is on the right of the drawing. */
export const RoomPlan = () => (
  <figure className="m-0 flex flex-col gap-1">
    <svg
      role="img"
      aria-label="Usual places around the table, seen from above; the table beside it holds the coordinates."
      viewBox={`-30 0 ${(box.right - box.left) * scale + 30} ${(box.head - box.foot) * scale}`}
      className="block w-full max-w-[30rem]"
      fontSize="12"
    >
      {[1, 2, 3].map((radiusM) => (
        <circle
          key={radiusM}
          cx={placeX(0)}
          cy={placeY(0)}
          r={radiusM * scale}
          className="fill-none stroke-rule"
          strokeDasharray="3 3"
        />
      ))}
      <rect
        x={placeX(-0.25)}
        y={placeY(1)}
        width={0.5 * scale}
        height={3 * scale}
        rx="6"
        className="fill-surface stroke-edge"
      />
      <circle cx={placeX(0)} cy={placeY(0.78)} r={0.11 * scale} className="fill-none stroke-edge" />
      <path
        d={`M${placeX(0) - 7} ${placeY(0)}h14M${placeX(0)} ${placeY(0) - 7}v14`}
        className="stroke-lee"
        strokeWidth="1.6"
      />
      {inside.map(([preset, { xM, yM }]) => (
        <g key={preset}>
          <circle cx={placeX(xM)} cy={placeY(yM)} r="4.5" className="fill-lee stroke-paper" />
          <text
            x={placeX(xM) + (isLeft(xM) ? -9 : 9)}
            y={placeY(yM) + 4}
            textAnchor={isLeft(xM) ? 'end' : 'start'}
            className="fill-ink"
          >
            {positionPresetNames[preset]}
          </text>
        </g>
      ))}
    </svg>
    <figcaption className="text-sm text-ink-2">
      From above, head up; circles 1, 2 and 3 m from the isocentre (cross).
    </figcaption>
  </figure>
);
