/** What the parameters mean, for whoever is in their field; apart, so that a screen loads it late. */

import type { SectionKey, SharedKey } from './parameters';

export const parameterHelp: Readonly<Record<SectionKey | SharedKey, string>> = {
  law: 'What moves by equal steps as the shaft turns. The law acts on the total capacitance. Oscillator: stays a fixed frequency away from section 1.',
  targetKind:
    'Capacitance at the terminals, or the band to be tuned with its coil and circuit stray.',
  lawPoints:
    'Shaft angle from where the law begins, and what the dial shall have there: total capacitance, or with band and coil the frequency. The range is that of its ends.',
  lawFormula:
    'Total capacitance against the swept fraction x from 0 to 1, in any scale: it is stretched to the range. Numbers, + - * / ^, pi, e, sqrt, exp, log, sin and the like.',
  minCapacitance: 'At the terminals with the plates fully open, trimmer included.',
  maxCapacitance: 'At the terminals with the plates fully meshed.',
  bandLow: 'Tuned with the plates fully meshed.',
  bandHigh: 'Tuned with the plates fully open.',
  inductance: 'The coil that this section tunes.',
  stray:
    'Coil, wiring and valve or transistor capacitance across the section, without the section itself.',
  intermediateFrequency:
    'By how much the oscillator of section 1’s circuit stays away from it. Plates cut for it serve one band and this one frequency. Usual: 450 to 470 kHz (common practice).',
  oscillatorSide: 'Above: signal plus intermediate frequency. Below: signal less it.',
  oscillatorCoil:
    'The coil that this section tunes. Left empty: with which its capacitance begins where that of section 1 does.',
  oscillatorStray:
    'Oscillator coil, wiring and valve or transistor across this section, without the section itself.',
  frameAllowance:
    'What the section has besides its plates: insulators, posts to frame, terminals. An allowance; measure it on a built one.',
  statorForm:
    'A sector of even radius, or one that follows the meshed rotor at the overhang: its far side stays small, which a law that begins slowly needs.',
  rotorPlates: 'Plates on the shaft in this section.',
  statorPlates: 'Plates on the posts; one more, one fewer or as many as the rotor has.',
  airGap: 'One side, rotor face to stator face.',
  rotorThickness: 'Thickness of a rotor plate.',
  statorThickness: 'Thickness of a stator plate.',
  permittivity:
    'Of the air or other gas or liquid in the gap. Dry air at 20 °C and 1013 hPa: 1.000537.',
  dielectric:
    'Air; a film in each gap with air beside it; or one solid disc that fills the gap between one rotor and one stator plate.',
  filmThickness: 'Of the film in each gap; air fills the rest.',
  filmPermittivity:
    'Relative. Handbook ranges: mica 5.4, PTFE 2.1, polyethylene 2.25 to 2.3, polystyrene 2.5 to 2.6. Ceramics: as their maker says.',
  workingVoltage: 'Largest peak voltage across the section, direct and alternating together.',
  workingFrequency:
    'For loss and for what the gap holds at radio frequency. Left empty: taken from the band, or 50 Hz.',
  arrangement:
    'One stator; one rotor that passes from a stator into another; two equal sets of plates in series, stator to stator; or two blades and two stators in series, on a quarter turn.',
  travel: 'Shaft rotation from the open to the meshed stop.',
  openRest:
    'Shaft rotation from the open stop to where the law begins. Left empty: until edges that pass each other no longer disturb it.',
  meshedRest:
    'Shaft rotation from where the law ends to the meshed stop. Left empty: as much as the edges need.',
  rotorSector: 'Angle of the blade from its leading to its trailing edge.',
  statorSector: 'Angle of the stator from edge to edge.',
  statorEdgeOffset:
    'How far the straight edges of the stator lie inside their radial lines, parallel to them.',
  sense: 'Seen from the side on which the plates are drawn.',
  shaftDiameter: 'Nominal diameter; the hole in the rotor plate is drawn at this size.',
  spacerRadius: 'Outside radius of the spacers between rotor plates.',
  hubRadius: 'Radius of the rotor plate round the shaft, away from the blade.',
  cutoutRadius: 'Radius of the opening in the stator round the shaft.',
  overhang: 'How far the stator reaches past the longest rotor radius.',
  postCount: 'Posts that carry the stator plates.',
  postHoleDiameter: 'Diameter of the hole for a post.',
  postSpacerRadius: 'Outside radius of the spacers between stator plates.',
  postWeb: 'Width of the ring of sheet left round each post hole.',
  postClearance: 'Smallest distance allowed between the sweep of the rotor and a post spacer.',
  postCircleRadius:
    'Distance of the posts from the shaft. Left empty: as near as the clearance allows.',
  largestRadius: 'From the shaft to the furthest part, stator ears and sweep included.',
  largestDepth: 'Along the shaft, over all plates of all sections.',
  sectionSpacing:
    'Clear distance along the shaft between neighbouring sections; a screen between them adds its thickness.',
  material: 'What the plates are cut from.',
  finish:
    'Silver plated plates lose less at radio frequency, if the silver is some skin depths thick.',
  spacerMaterial:
    'What spacers are turned or cut from; with the plates it sets how the gaps drift with temperature.',
  altitude: 'Above sea level. Thinner air holds less voltage.',
  spacerMake: 'Turned to length, or rings cut from sheet of just that thickness.',
  endSlots:
    'Divide the first and the last rotor plate of a section into segments that are bent to trim the law. 0 for none.',
  endSlotWidth: 'One sheet thickness or more can be cut safely (common practice).',
  screens:
    'An earthed plate midway between neighbouring sections, held on the posts between insulating spacers, so that their stators do not act on each other.',
  screenThickness: 'Thickness of a screen; it adds to the depth.',
  frame:
    'Two end plates that carry shaft, posts and pillars, or none: plates and spacers alone.',
  frameMaterial: 'What the end plates are cut from.',
  frameThickness: 'Thickness of an end plate.',
  frameClearance:
    'Clear distance along the shaft from the outermost plate to an end plate. What the frame adds to the capacitance is in the allowance.',
  bearingDiameter:
    'Hole in the end plates for the bush or bearing of the shaft. Left empty: 4 mm more than the shaft.',
  bushFlange:
    'Thickness of the flange of the bush that holds a post in the frame, on either face of the end plate.',
  pillarDiameter:
    'Diameter of the pillars that hold the end plates apart, away from the stator.',
  shaftFront: 'Length of shaft that stands out in front of the front plate.',
  bracket: 'A flat plate on the front pillars to screw the capacitor to a panel.',
  toleranceClass: 'For what the drawing gives no tolerance of its own: fine, medium or coarse.',
  projection:
    'How the views of the drawing stand to each other; its symbol is in the title block.',
};
