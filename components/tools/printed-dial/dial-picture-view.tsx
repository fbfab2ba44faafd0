import type { PicturePoint } from '@/geometry/tracking/dial-picture';
import type { PictureMarks } from './picture-marks';

export interface OpenPicture {
  readonly url: string;
  readonly name: string;
  readonly width: number;
  readonly height: number;
}

/** The picture with what has been picked; a press tells where it fell, in the picture's pixels. */
export function DialPictureView({
  picture,
  marks,
  onPress,
}: {
  picture: OpenPicture;
  marks: PictureMarks;
  onPress: (at: PicturePoint) => void;
}) {
  const { width, height, url, name } = picture;
  const size = Math.max(width, height) / 60;

  function press(event: React.MouseEvent<SVGSVGElement>) {
    const matrix = event.currentTarget.getScreenCTM();
    if (!matrix) return;
    const at = new DOMPoint(event.clientX, event.clientY).matrixTransform(matrix.inverse());
    onPress({ x: at.x, y: at.y });
  }

  const cross = ({ x, y }: PicturePoint): string =>
    `M${x - size} ${y}h${2 * size}M${x} ${y - size}v${2 * size}`;
  const { centre, references, frequencies } = marks;
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      role="img"
      aria-label={`Dial from ${name}, ${frequencies.length} marks picked`}
      onClick={press}
      className="max-h-96 w-full cursor-crosshair bg-floor"
    >
      <image href={url} width={width} height={height} />
      {centre && (
        <path
          d={cross(centre)}
          className="stroke-bad"
          strokeWidth="2"
          vectorEffect="non-scaling-stroke"
        />
      )}
      {references.map(
        (mark, i) =>
          mark && (
            <circle
              key={i}
              cx={mark.x}
              cy={mark.y}
              r={size}
              className="fill-none stroke-bad"
              strokeWidth="2"
              vectorEffect="non-scaling-stroke"
            />
          ),
      )}
      {frequencies.map((mark, i) => (
        <path
          key={i}
          d={cross(mark)}
          transform={`rotate(45 ${mark.x} ${mark.y})`}
          className="stroke-action"
          strokeWidth="2"
          vectorEffect="non-scaling-stroke"
        />
      ))}
    </svg>
  );
}
