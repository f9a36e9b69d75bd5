import { memo } from 'react';
import { findShadeFill, type StripBlock } from './strip.types';
import type { StripScale } from './strip-scale';

type StripBlocksProps = { blocks: readonly StripBlock[]; scale: StripScale; patternId: string };

const leastBreadthPx = 1.5;

export function outlineBlock(block: StripBlock, scale: StripScale) {
  const x = scale.placeX(block.from);
  const width = Math.max(leastBreadthPx, scale.placeX(block.to) - x);
  const height = Math.max(1.5, scale.tall(block.height));
  return { x, width, height, y: block.side === 'above' ? scale.base - height : scale.base };
}

/** The blocks of the large strip: shade by class; the second kind hatched and capped. */
export const StripBlocks = memo(function StripBlocks({ blocks, scale, patternId }: StripBlocksProps) {
  return (
    <>
      {blocks.map((block, index) => {
        const outline = outlineBlock(block, scale);
        if (outline.x > scale.plotRight || outline.x + outline.width < scale.plotLeft) return null;
        const capY = block.side === 'above' ? outline.y - 3 : outline.y + outline.height;
        return (
          <g key={index}>
            <rect
              {...outline}
              className={`${findShadeFill(block.shade)} stroke-ramp-4`}
              strokeWidth="0.6"
              strokeDasharray={block.shade === null ? '2 2' : undefined}
            />
            {block.isPatterned && (
              <>
                <rect {...outline} fill={`url(#${patternId})`} />
                <rect
                  x={outline.x - 0.5}
                  y={capY}
                  width={outline.width + 1}
                  height="3"
                  className="fill-sounding"
                />
              </>
            )}
          </g>
        );
      })}
    </>
  );
});

export const HatchPattern = ({ id }: { id: string }) => (
  <pattern id={id} width="5" height="5" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
    <path d="M0 0v5" className="stroke-sounding" strokeWidth="2.4" />
  </pattern>
);
