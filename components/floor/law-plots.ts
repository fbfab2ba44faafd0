import type uPlot from 'uplot';
import { INSET_LEFT, INSET_RIGHT } from './insets';
import { palette } from './palette';
import type { PlotKind } from './use-plot';

/** Room over each plot for the letters of its scales, CSS px. */
const PLOT_TOP = 24;
const PLOT_BOTTOM = 6;

/**
 * What both plots share: the travel across exactly the width of the angle rule. `right` keeps the
 * right inset where no scale stands in it.
 */
function base(
  font: string,
  travel: () => number,
  right: number,
): Partial<uPlot.Options> & {
  axes: uPlot.Axis[];
} {
  return {
    legend: { show: false },
    cursor: { show: false },
    padding: [PLOT_TOP, right, PLOT_BOTTOM, 0],
    axes: [
      {
        // The angle rule above is the scale of this axis; here it only rules lines.
        size: 0,
        splits: () => multiples(30, travel()),
        values: (_, splits) => splits.map(() => ''),
        grid: { stroke: palette.line, width: 1 },
        ticks: { show: false },
        font,
      },
    ],
  };
}

const multiples = (step: number, to: number) =>
  Array.from({ length: Math.floor(to / step + 1e-6) + 1 }, (_, i) => i * step);

function axis(font: string, options: uPlot.Axis): uPlot.Axis {
  return {
    font,
    stroke: palette.ink2,
    gap: 6,
    ticks: { show: false },
    grid: { stroke: palette.line, width: 1 },
    values: (_, splits) => splits.map((split) => String(Number(split.toPrecision(6)))),
    ...options,
  };
}

type Options = PlotKind['options'];

/** Capacitance asked, achieved and of the area alone, with the frequency on its own scale when there is a coil. */
const lawOptions: Options = (font, series, size) => {
  const travel = () => series().angle.at(-1)!;
  const tuned = series().tuned !== null;
  const shared = base(font, travel, tuned ? 0 : INSET_RIGHT);
  return {
    ...shared,
    ...size,
    scales: {
      x: { time: false, range: () => [0, travel()] },
      capacitance: { range: (_, low, high) => padded(low, high) },
      frequency: { range: (_, low, high) => padded(low, high) },
    },
    axes: [
      ...shared.axes,
      axis(font, { scale: 'capacitance', size: INSET_LEFT, space: 28 }),
      ...(tuned
        ? [
            axis(font, {
              scale: 'frequency',
              side: 1,
              size: INSET_RIGHT,
              space: 28,
              stroke: palette.action,
              grid: { show: false },
            }),
          ]
        : []),
    ],
    series: [
      {},
      {
        scale: 'capacitance',
        stroke: palette.brassDark,
        width: 2.5,
        pxAlign: 0,
        points: { show: false },
      },
      {
        scale: 'capacitance',
        stroke: palette.ink,
        width: 1.5,
        dash: [2, 5],
        pxAlign: 0,
        points: { show: false },
      },
      {
        scale: 'capacitance',
        stroke: palette.steelDark,
        width: 1,
        dash: [6, 3],
        pxAlign: 0,
        points: { show: false },
      },
      ...(tuned
        ? [
            {
              scale: 'frequency',
              stroke: palette.action,
              width: 2,
              pxAlign: 0,
              points: { show: false },
            },
          ]
        : []),
    ],
  };
};

/** The law error in a strip of its own, with its largest value ringed. */
const errorOptions: Options = (font, series, size) => {
  const travel = () => series().angle.at(-1)!;
  const shared = base(font, travel, INSET_RIGHT);
  return {
    ...shared,
    ...size,
    scales: {
      x: { time: false, range: () => [0, travel()] },
      error: { range: () => symmetric(series().error) },
    },
    axes: [
      ...shared.axes,
      axis(font, {
        scale: 'error',
        size: INSET_LEFT,
        splits: (_, __, low, high) => [low / 1.2, 0, high / 1.2],
        values: (_, splits) => splits.map(signed),
      }),
    ],
    series: [
      {},
      { scale: 'error', stroke: palette.bad, width: 1.5, pxAlign: 0, points: { show: false } },
    ],
    hooks: {
      draw: [
        (plot) => {
          const at = series().largest;
          const { ctx } = plot;
          ctx.save();
          ctx.strokeStyle = palette.ink;
          ctx.lineWidth = 1.5 * devicePixelRatio;
          ctx.beginPath();
          ctx.arc(
            plot.valToPos(at.angle, 'x', true),
            plot.valToPos(at.error, 'error', true),
            4 * devicePixelRatio,
            0,
            2 * Math.PI,
          );
          ctx.stroke();
          ctx.restore();
        },
      ],
    },
  };
};

function padded(low: number | null, high: number | null): [number, number] {
  if (low === null || high === null) return [0, 1];
  const room = 0.06 * (high - low || Math.abs(high) || 1);
  return [low - room, high + room];
}

function symmetric(errors: readonly (number | null)[]): [number, number] {
  const largest =
    errors.reduce<number>((most, error) => Math.max(most, Math.abs(error ?? 0)), 0) || 1;
  const power = 10 ** Math.floor(Math.log10(largest));
  const top = Math.ceil(largest / power) * power;
  return [-1.2 * top, 1.2 * top];
}

function signed(value: number): string {
  const number = String(Number(Math.abs(value).toPrecision(2)));
  if (Number(number) === 0) return '0';
  return value < 0 ? `−${number}` : `+${number}`;
}

export const lawPlot: PlotKind = {
  data: ({ angle, achieved, target, areaOnly, tuned }) => [
    angle,
    achieved,
    target,
    areaOnly,
    ...(tuned ? [tuned] : []),
  ],
  options: lawOptions,
};

export const errorPlot: PlotKind = {
  data: ({ angle, error }) => [angle, error],
  options: errorOptions,
};
