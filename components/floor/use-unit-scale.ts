import { useLayoutEffect, type RefObject } from 'react';

/**
 * Keeps the CSS variable `--px` of an SVG at the number of drawing units in one CSS pixel, so that
 * lettering keeps its size while the drawing scales with its container.
 * @param span width and height of the square view box, drawing units.
 */
export function useUnitScale(ref: RefObject<SVGSVGElement | null>, span: number): void {
  useLayoutEffect(() => {
    const svg = ref.current;
    if (!svg) return;
    const fit = () => {
      const side = Math.min(svg.clientWidth, svg.clientHeight);
      if (side > 0) svg.style.setProperty('--px', String(span / side));
    };
    fit();
    const observer = new ResizeObserver(fit);
    observer.observe(svg);
    return () => observer.disconnect();
  }, [ref, span]);
}
