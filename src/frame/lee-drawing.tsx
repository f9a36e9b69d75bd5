/** Rings around a source, held back behind a screen: contour lines of the shelter that names the product. */
const source = { x: 170, y: 210 };
const shadow = { centreDeg: 28, halfWidthDeg: 23, edgeDeg: 7, remaining: 0.34 };
const rings = [52, 78, 112, 156, 214, 290, 390, 520];

const toRad = (deg: number): number => (deg * Math.PI) / 180;

/** How far a contour reaches in a direction, as a share of its radius in the open. */
function findReach(deg: number): number {
  const off = Math.abs(deg - shadow.centreDeg) - shadow.halfWidthDeg;
  const open = Math.min(1, Math.max(0, 0.5 + off / (2 * shadow.edgeDeg)));
  const eased = open * open * (3 - 2 * open);
  return shadow.remaining + (1 - shadow.remaining) * eased;
}

function drawRing(radius: number): string {
  // Rings inside the screen's distance are whole.
  const points = Array.from({ length: 900 }, (_, step) => {
    const deg = step * 0.4 - 180;
    const reach = radius < 70 ? radius : Math.max(68, radius * findReach(deg));
    const wobble = 1 + 0.018 * Math.sin(toRad(deg) * 3 + radius);
    const x = source.x + reach * wobble * Math.cos(toRad(deg));
    const y = source.y + reach * wobble * Math.sin(toRad(deg));
    return `${x.toFixed(1)} ${y.toFixed(1)}`;
  });
  return `M${points.join('L')}Z`;
}

const paths = rings.map(drawRing);

export const LeeDrawing = ({ className }: { className?: string }) => (
  <svg viewBox="0 0 640 640" preserveAspectRatio="xMidYMid slice" aria-hidden="true" className={className}>
    <g fill="none" strokeWidth="1.2">
      {paths.map((path, place) => (
        <path
          key={path}
          d={path}
          className={place % 3 === 1 ? 'stroke-ramp-3' : 'stroke-ramp-2'}
          strokeWidth={place % 3 === 1 ? 1.6 : 1}
        />
      ))}
    </g>
    <path d="M222 213l-14 46" className="stroke-ink" strokeWidth="5" strokeLinecap="round" />
    <circle cx="368" cy="318" r="6" className="fill-lee" />
    <path d={`M${source.x - 7} ${source.y}h14M${source.x} ${source.y - 7}v14`} className="stroke-ink" />
  </svg>
);
