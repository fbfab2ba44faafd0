import type { PolarGrid } from './polar-grid';
import { toRadians } from './degrees';

const LINE_EVERY = 15;
const LETTER_EVERY = 30;
const degrees = (every: number) => Array.from({ length: 360 / every }, (_, i) => i * every);

const letter = { fontSize: 'calc(var(--px) * 12px)' };

/** Rings, polar lines and their lettering; y down, as SVG has it. */
export function PolarLines({ grid }: { grid: PolarGrid }) {
  const inner = grid.step;
  return (
    <g aria-hidden="true">
      <g className="fill-none stroke-scribe/25">
        {grid.rings.map((ring) => (
          <circle key={ring} r={ring} vectorEffect="non-scaling-stroke" />
        ))}
        {degrees(LINE_EVERY).map((degree) => {
          const [x, y] = at(degree, 1);
          const from = degree % 90 === 0 ? 0 : inner;
          return (
            <line
              key={degree}
              x1={x * from}
              y1={y * from}
              x2={x * grid.radius}
              y2={y * grid.radius}
              vectorEffect="non-scaling-stroke"
            />
          );
        })}
      </g>
      <g className="fill-scribe font-mono" style={letter} textAnchor="middle">
        {degrees(LETTER_EVERY).map((degree) => {
          const [x, y] = at(degree, grid.radius);
          // Outside the outermost ring by about one line, along the polar line.
          const [dx, dy] = at(degree, 1.45);
          return (
            <text key={degree} x={x} y={y} dx={`${dx * 1.15}em`} dy={`${dy + 0.35}em`}>
              {degree}°
            </text>
          );
        })}
      </g>
    </g>
  );
}

/** Radii lettered along the line to the left, above what is drawn, with the floor as their ground; none within `from`, mm. */
export function RingLetters({ grid, from }: { grid: PolarGrid; from: number }) {
  return (
    <g
      aria-hidden="true"
      className="pointer-events-none fill-scribe stroke-floor font-mono"
      style={{ ...letter, paintOrder: 'stroke', strokeWidth: 'calc(var(--px) * 4px)' }}
      strokeLinejoin="round"
      textAnchor="start"
    >
      {grid.rings
        .filter((ring) => ring > from)
        .map((ring) => (
          <text
            key={ring}
            x={-ring}
            y={0}
            dx="0.3em"
            dy="1.2em"
            // Every other one on a narrow screen, counted from the outermost.
            className={
              grid.rings.length > 4 && (grid.rings.length - grid.rings.indexOf(ring)) % 2 === 0
                ? 'hidden @xl:block'
                : undefined
            }
          >
            {ring}
          </text>
        ))}
    </g>
  );
}

/** Numbers rounded so that server and browser write the same attribute. */
function at(degree: number, radius: number): [number, number] {
  const angle = toRadians(degree);
  return [round(radius * Math.cos(angle)), round(-radius * Math.sin(angle))];
}

const round = (value: number) => Number(value.toFixed(4));
