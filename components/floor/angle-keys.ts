/**
 * The degrees to which a key takes the angle rule, or null for a key that is not its own. Steps go
 * to whole degrees, or whole tens, so that a dragged angle comes back to the marks.
 * @param at degrees now. @param travel degrees.
 */
export function angleAfterKey(
  key: string,
  shift: boolean,
  at: number,
  travel: number,
): number | null {
  switch (key) {
    case 'ArrowRight':
    case 'ArrowUp':
      return shift ? next(at, 10) : next(at, 1);
    case 'ArrowLeft':
    case 'ArrowDown':
      return shift ? previous(at, 10) : previous(at, 1);
    case 'PageUp':
      return next(at, 10);
    case 'PageDown':
      return previous(at, 10);
    case 'Home':
      return 0;
    case 'End':
      return travel;
    default:
      return null;
  }
}

/** Radians come back as degrees with an error in the last digits; this much is no distance. */
const SAME = 1e-6;

const next = (at: number, step: number) => (Math.floor(at / step + SAME) + 1) * step;
const previous = (at: number, step: number) => (Math.ceil(at / step - SAME) - 1) * step;

/**
 * An angle as somebody types it: `115`, `115.5°`, `115,5 deg`.
 * @returns degrees, or what is wrong with it.
 */
export function readDegrees(
  text: string,
  travel: number,
): { readonly degrees: number } | { readonly problem: string } {
  const most = Number(travel.toFixed(1));
  const match = /^\s*([-+]?\d*[.,]?\d+|[-+]?\d+[.,])\s*(°|deg|degrees)?\s*$/i.exec(text);
  if (!match) {
    return {
      problem: `Shaft angle: “${text.trim()}” is no angle. Type degrees, 0 to ${most}.`,
    };
  }
  const degrees = Number(match[1]!.replace(',', '.'));
  if (degrees < 0 || degrees > travel + 0.05) {
    return { problem: `Shaft angle: ${degrees}° is outside the travel. Type 0 to ${most}.` };
  }
  return { degrees };
}
