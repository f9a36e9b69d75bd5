import { memo } from 'react';
import { findShadeFill, type StripBlock } from './strip.types';
import type { StripScale } from './strip-scale';

type StripBlocksProps = { blocks: readonly StripBlock[]; scale: StripScale; patternId: string };

const leastBreadthPx = 2;

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
              className={`${findShadeFill(block.shade)} stroke-ramp-3`}
              // The two faintest shades need an edge against the paper; the others would lose their tone to it.
              strokeWidth={block.shade === null || block.shade < 2 ? 0.7 : 0}
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
