/**
 * CSS pixels from the left and right edges of the angle rule and the law chart to the ends of the
 * travel. Both use them, so that an angle stands at the same x in either; the scales of the chart
 * are lettered inside them.
 */
export const INSET_LEFT = 52;
export const INSET_RIGHT = 52;
