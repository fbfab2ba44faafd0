/** A dial to print, true size: round on the shaft or a drive, or straight along a cord. */

import type { SectionResult, Turn } from '../derived';
import type { Sketch } from '../sketch/sketch';
import { roundDial } from './round';
import { checkSettings, type DialSettings } from './settings';
import { straightDial } from './straight';

/** @throws DialError */
export function dialOf(section: SectionResult, turn: Turn, settings: DialSettings): Sketch {
  checkSettings(settings);
  return (settings.form === 'round' ? roundDial : straightDial)(section, turn, settings);
}
