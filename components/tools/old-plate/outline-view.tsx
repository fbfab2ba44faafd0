import { svgPath } from '@/components/floor/svg-path';
import type { Point } from '@/geometry';
import { contourBounds } from '@/geometry/measure';
import type { OldOutline } from './read-file';

/** The old plate as drawn, on the floor; a press sets the shaft's centre. */
export function OutlineView({
  outline,
  centre,
  leading,
  onCentre,
}: {
  outline: OldOutline;
  centre: Point;
  /** Bearing of the leading edge, rad; null while it isn't known. */
  leading: number | null;
  onCentre: (centre: Point) => void;
}) {
  const { plate, circles } = outline;
  const { minX, minY, maxX, maxY } = contourBounds(plate);
  const room = 0.08 * Math.max(maxX - minX, maxY - minY);
  const [x, y, w, h] = [
    minX - room,
    minY - room,
    maxX - minX + 2 * room,
    maxY - minY + 2 * room,
  ];
  const reach = Math.hypot(w, h);

  function press(event: React.MouseEvent<SVGSVGElement>) {
    const matrix = event.currentTarget.getScreenCTM();
    if (!matrix) return;
    const at = new DOMPoint(event.clientX, event.clientY).matrixTransform(matrix.inverse());
    onCentre({ x: at.x, y: -at.y });
  }

  return (
    <svg
      viewBox={`${x} ${-y - h} ${w} ${h}`}
      role="img"
      aria-label={`Outline from ${outline.name}`}
      onClick={press}
      className="max-h-72 w-full cursor-crosshair bg-floor"
    >
      <g transform="scale(1 -1)">
        <path
          d={svgPath([plate, ...circles])}
          fillRule="evenodd"
          className="fill-brass/65 stroke-brass"
          strokeWidth="1.5"
          vectorEffect="non-scaling-stroke"
        />
        <path
          d={`M${centre.x - reach / 30} ${centre.y}h${reach / 15}M${centre.x} ${centre.y - reach / 30}v${reach / 15}`}
          className="stroke-scribe"
          strokeWidth="1.5"
          vectorEffect="non-scaling-stroke"
        />
        {leading !== null && (
          <path
            d={`M${centre.x} ${centre.y}l${reach * Math.cos(leading)} ${reach * Math.sin(leading)}`}
            className="stroke-scribe"
            strokeDasharray="6 4"
            strokeWidth="1.5"
            vectorEffect="non-scaling-stroke"
          />
        )}
      </g>
    </svg>
  );
}
