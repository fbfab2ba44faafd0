import { useLayoutEffect, type RefObject } from 'react';

/** CSS pixels kept free round the outermost ring for the lettering of the polar lines. */
const ROOM_ACROSS = 40;
const ROOM_DOWN = 32;
/** Side of the square that is assumed until there is a container to measure, CSS px. */
const ASSUMED_SIDE = 560;

/** The view box that fills a frame, and the drawing units in one CSS pixel. */
function fittedView(radius: number, width: number, height: number) {
  const room = Math.min(width - 2 * ROOM_ACROSS, height - 2 * ROOM_DOWN);
  const unit = (2 * radius) / Math.max(room, 1);
  const box = [-width / 2, -height / 2, width, height].map((px) =>
    Number((px * unit).toFixed(4)),
  );
  return { viewBox: box.join(' '), unit };
}

/** What to draw first, on the server too. @param radius of the outermost ring, mm. */
export function assumedView(radius: number) {
  return fittedView(radius, ASSUMED_SIDE, ASSUMED_SIDE);
}

/**
 * Fits the SVG layers of a frame to it, the shaft in its middle, and keeps the frame's CSS variable
 * `--px` at the drawing units in one CSS pixel: lettering keeps its size while the drawing scales.
 * @param radius of the outermost ring, mm.
 */
export function useFittedView(ref: RefObject<HTMLElement | null>, radius: number): void {
  useLayoutEffect(() => {
    const frame = ref.current;
    if (!frame) return;
    const fit = () => {
      const { clientWidth, clientHeight } = frame;
      if (clientWidth === 0 || clientHeight === 0) return;
      const { viewBox, unit } = fittedView(radius, clientWidth, clientHeight);
      for (const layer of frame.querySelectorAll('svg')) layer.setAttribute('viewBox', viewBox);
      frame.style.setProperty('--px', String(unit));
    };
    fit();
    const observer = new ResizeObserver(fit);
    observer.observe(frame);
    return () => observer.disconnect();
  }, [ref, radius]);
}
