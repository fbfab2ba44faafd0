import { useEffect, useRef, type RefObject } from 'react';
import uPlot from 'uplot';
import type { LawSeries } from './law-series';

export interface PlotSize {
  readonly width: number;
  readonly height: number;
}

/** How a law is plotted. A plot outlives a change of numbers, so it asks `series` when it draws. */
export interface PlotKind {
  data(series: LawSeries): uPlot.AlignedData;
  options(font: string, series: () => LawSeries, size: PlotSize): uPlot.Options;
}

/**
 * A uPlot in an element, as large as the element. New numbers go in by setData; it is built anew
 * only when its kind, or having a frequency, changes.
 */
export function usePlot(
  host: RefObject<HTMLElement | null>,
  kind: PlotKind,
  series: LawSeries,
): void {
  const plot = useRef<uPlot | null>(null);
  const latest = useRef(series);
  const tuned = series.tuned !== null;

  useEffect(() => {
    latest.current = series;
    plot.current?.setData(kind.data(series));
  }, [kind, series]);

  useEffect(() => {
    const element = host.current;
    if (!element) return;
    const size = () => ({
      width: Math.max(1, element.clientWidth),
      height: Math.max(1, element.clientHeight),
    });
    const font = `12.5px ${getComputedStyle(element).fontFamily}`;
    const made = new uPlot(
      kind.options(font, () => latest.current, size()),
      kind.data(latest.current),
      element,
    );
    plot.current = made;
    const observer = new ResizeObserver(() => made.setSize(size()));
    observer.observe(element);
    // A canvas draws with whatever font is there; letter it again once ours has come.
    let standing = true;
    void document.fonts.ready.then(() => standing && made.redraw(false, true));
    return () => {
      standing = false;
      observer.disconnect();
      plot.current = null;
      made.destroy();
    };
  }, [host, kind, tuned]);
}
