/**
 * The parameter table: every number and choice a design holds, declared once. The form, the
 * JSON schema, the bounds check and the defaults are all made from it.
 *
 * Values are in kernel units: mm, rad, F, H, Hz, V (peak); counts and ratios are bare.
 */

import type { LawPoint } from './law-points';

export type Quantity =
  | 'length'
  | 'altitude'
  | 'angle'
  | 'capacitance'
  | 'inductance'
  | 'frequency'
  | 'voltage'
  | 'count'
  | 'ratio';

export type TargetKind = 'terminals' | 'band';

/** Choices of the same table under which a parameter counts; all of them must hold. */
export type AppliesTo = Readonly<Record<string, readonly string[]>>;

export type ParameterGroup =
  'law' | 'turn' | 'stack' | 'shaft' | 'posts' | 'envelope' | 'sheet' | 'frame';

export interface NumberParameter {
  readonly kind: 'number';
  readonly quantity: Quantity;
  readonly group: ParameterGroup;
  readonly label: string;
  /** Smallest and largest value accepted, inclusive, in kernel units. */
  readonly min: number;
  readonly max: number;
  readonly default: number;
  /** Without it the parameter always counts. */
  readonly appliesTo?: AppliesTo;
  /** Designs stored before the parameter came hold its default. */
  readonly cameLater?: true;
}

/** A number that may be left empty: `null` lets the kernel choose. */
export interface OptionalNumberParameter extends Omit<NumberParameter, 'kind' | 'default'> {
  readonly kind: 'optional-number';
  readonly default: null;
}

export interface ChoiceParameter<V extends string = string> {
  readonly kind: 'choice';
  readonly group: ParameterGroup;
  readonly label: string;
  readonly options: readonly { readonly value: V; readonly label: string }[];
  readonly default: V;
  readonly appliesTo?: AppliesTo;
  readonly cameLater?: true;
}

/** A table of angles and values, rising. */
export interface PointsParameter {
  readonly kind: 'points';
  readonly group: ParameterGroup;
  readonly label: string;
  readonly default: readonly LawPoint[];
  readonly appliesTo?: AppliesTo;
  readonly cameLater?: true;
}

/** Text that the kernel reads by itself. */
export interface TextParameter {
  readonly kind: 'text';
  readonly group: ParameterGroup;
  readonly label: string;
  readonly longest: number;
  readonly default: string;
  readonly appliesTo?: AppliesTo;
  readonly cameLater?: true;
}

export type Parameter =
  NumberParameter | OptionalNumberParameter | ChoiceParameter | PointsParameter | TextParameter;

type ValueOf<P> =
  P extends ChoiceParameter<infer V>
    ? V
    : P extends OptionalNumberParameter
      ? number | null
      : P extends PointsParameter
        ? readonly LawPoint[]
        : P extends TextParameter
          ? string
          : number;

export type ValuesOf<T> = { -readonly [K in keyof T]: ValueOf<T[K]> };

type NumberOptions = Omit<NumberParameter, 'kind' | 'quantity' | 'group'>;

const number =
  (quantity: Quantity) =>
  (group: ParameterGroup, options: NumberOptions): NumberParameter => ({
    kind: 'number',
    quantity,
    group,
    ...options,
  });

const length = number('length');
const angle = number('angle');
const capacitance = number('capacitance');
const inductance = number('inductance');
const frequency = number('frequency');
const voltage = number('voltage');
const altitude = number('altitude');
const count = number('count');
const ratio = number('ratio');

const optional = (
  quantity: Quantity,
  group: ParameterGroup,
  options: Omit<NumberOptions, 'default'>,
): OptionalNumberParameter => ({
  kind: 'optional-number',
  quantity,
  group,
  default: null,
  ...options,
});

function choice<V extends string>(
  group: ParameterGroup,
  options: Omit<ChoiceParameter<V>, 'kind' | 'group'>,
): ChoiceParameter<V> {
  return { kind: 'choice', group, ...options };
}

const DEGREE = Math.PI / 180;

/** Laws whose range is given beside them; a table brings its own, an oscillator follows section 1. */
const RANGED = ['capacitance', 'wavelength', 'frequency', 'logarithmic', 'formula'];
const TERMINALS: AppliesTo = { targetKind: ['terminals'], law: RANGED };
const BAND_ENDS: AppliesTo = { targetKind: ['band'], law: RANGED };
const OWN_RANGE = [...RANGED, 'points'];
const BAND: AppliesTo = { targetKind: ['band'], law: OWN_RANGE };
const TRACKED: AppliesTo = { law: ['tracked'] };
const FRAMED: AppliesTo = { frame: ['end-plates'] };

/** Parameters of one section: its law, its target and its plates. */
export const sectionParameters = {
  law: choice<
    | 'capacitance'
    | 'wavelength'
    | 'frequency'
    | 'logarithmic'
    | 'points'
    | 'formula'
    | 'tracked'
  >('law', {
    label: 'Tuning law',
    options: [
      { value: 'capacitance', label: 'capacitance' },
      { value: 'wavelength', label: 'wavelength' },
      { value: 'frequency', label: 'frequency' },
      { value: 'logarithmic', label: 'log' },
      { value: 'points', label: 'own table' },
      { value: 'formula', label: 'formula' },
      { value: 'tracked', label: 'oscillator' },
    ],
    default: 'frequency',
  }),
  targetKind: choice<TargetKind>('law', {
    label: 'Range given as',
    options: [
      { value: 'band', label: 'band and coil' },
      { value: 'terminals', label: 'capacitance' },
    ],
    default: 'band',
    appliesTo: { law: OWN_RANGE },
  }),
  lawPoints: {
    kind: 'points',
    group: 'law',
    label: 'Table of the law',
    default: [],
    appliesTo: { law: ['points'] },
    cameLater: true,
  } as PointsParameter,
  lawFormula: {
    kind: 'text',
    group: 'law',
    label: 'Formula of the law',
    longest: 200,
    default: 'x^1.5',
    appliesTo: { law: ['formula'] },
    cameLater: true,
  } as TextParameter,
  minCapacitance: capacitance('law', {
    label: 'Capacitance, open',
    min: 0.1e-12,
    max: 20e-9,
    default: 40e-12,
    appliesTo: TERMINALS,
  }),
  maxCapacitance: capacitance('law', {
    label: 'Capacitance, meshed',
    min: 0.2e-12,
    max: 50e-9,
    default: 400e-12,
    appliesTo: TERMINALS,
  }),
  bandLow: frequency('law', {
    label: 'Band, low end',
    min: 1e3,
    max: 1e9,
    default: 530e3,
    appliesTo: BAND_ENDS,
  }),
  bandHigh: frequency('law', {
    label: 'Band, high end',
    min: 1e3,
    max: 1e9,
    default: 1700e3,
    appliesTo: BAND_ENDS,
  }),
  inductance: inductance('law', {
    label: 'Coil inductance',
    min: 1e-9,
    max: 1,
    default: 240e-6,
    appliesTo: BAND,
  }),
  stray: capacitance('law', {
    label: 'Circuit stray',
    min: 0,
    max: 5e-9,
    default: 15e-12,
    appliesTo: BAND,
  }),
  intermediateFrequency: frequency('law', {
    label: 'Intermediate frequency',
    min: 1e3,
    max: 1e9,
    default: 455e3,
    appliesTo: TRACKED,
    cameLater: true,
  }),
  oscillatorSide: choice<'above' | 'below'>('law', {
    label: 'Oscillator',
    options: [
      { value: 'above', label: 'above the signal' },
      { value: 'below', label: 'below the signal' },
    ],
    default: 'above',
    appliesTo: TRACKED,
    cameLater: true,
  }),
  oscillatorCoil: optional('inductance', 'law', {
    label: 'Oscillator coil',
    min: 1e-9,
    max: 1,
    appliesTo: TRACKED,
    cameLater: true,
  }),
  oscillatorStray: capacitance('law', {
    label: 'Oscillator stray',
    min: 0,
    max: 5e-9,
    default: 15e-12,
    appliesTo: TRACKED,
    cameLater: true,
  }),
  frameAllowance: capacitance('law', {
    label: 'Insulators and frame',
    min: 0,
    max: 200e-12,
    default: 2e-12,
  }),
  statorForm: choice<'by-law' | 'even' | 'following'>('stack', {
    label: 'Stator form',
    options: [
      { value: 'by-law', label: 'as the law needs' },
      { value: 'even', label: 'even radius' },
      { value: 'following', label: 'following the rotor' },
    ],
    default: 'by-law',
  }),
  rotorPlates: count('stack', {
    label: 'Rotor plates',
    min: 1,
    max: 60,
    default: 14,
  }),
  statorPlates: count('stack', {
    label: 'Stator plates',
    min: 1,
    max: 61,
    default: 15,
  }),
  airGap: length('stack', {
    label: 'Air gap',
    min: 0.1,
    max: 15,
    default: 0.5,
  }),
  rotorThickness: length('stack', {
    label: 'Rotor sheet',
    min: 0.1,
    max: 6,
    default: 0.8,
  }),
  statorThickness: length('stack', {
    label: 'Stator sheet',
    min: 0.1,
    max: 6,
    default: 0.8,
  }),
  permittivity: ratio('stack', {
    label: 'Relative permittivity',
    min: 1,
    max: 100,
    default: 1.000537,
  }),
  dielectric: choice<'air' | 'film' | 'disc'>('stack', {
    label: 'Between the plates',
    options: [
      { value: 'air', label: 'air' },
      { value: 'film', label: 'film and air' },
      { value: 'disc', label: 'solid disc' },
    ],
    default: 'air',
    cameLater: true,
  }),
  filmThickness: length('stack', {
    label: 'Film thickness',
    min: 0.005,
    max: 10,
    default: 0.05,
    appliesTo: { dielectric: ['film'] },
    cameLater: true,
  }),
  filmPermittivity: ratio('stack', {
    label: 'Permittivity of film or disc',
    min: 1,
    max: 5000,
    default: 2.1,
    appliesTo: { dielectric: ['film', 'disc'] },
    cameLater: true,
  }),
  workingVoltage: voltage('stack', {
    label: 'Working voltage, peak',
    min: 0,
    max: 50e3,
    default: 300,
  }),
  workingFrequency: optional('frequency', 'stack', {
    label: 'Working frequency',
    min: 1,
    max: 1e9,
    cameLater: true,
  }),
} as const satisfies Record<string, Parameter>;

/** Parameters that all sections on the shaft share. */
export const sharedParameters = {
  arrangement: choice<'single' | 'differential' | 'split-stator' | 'butterfly'>('turn', {
    label: 'Arrangement',
    options: [
      { value: 'single', label: 'single' },
      { value: 'differential', label: 'differential' },
      { value: 'split-stator', label: 'split stator' },
      { value: 'butterfly', label: 'butterfly' },
    ],
    default: 'single',
    cameLater: true,
  }),
  travel: angle('turn', {
    label: 'Travel',
    min: 60 * DEGREE,
    max: 330 * DEGREE,
    default: 180 * DEGREE,
  }),
  openRest: optional('angle', 'turn', {
    label: 'Rest before the law',
    min: 0,
    max: 120 * DEGREE,
  }),
  meshedRest: optional('angle', 'turn', {
    label: 'Rest after the law',
    min: 0,
    max: 90 * DEGREE,
  }),
  rotorSector: angle('turn', {
    label: 'Rotor sector',
    min: 20 * DEGREE,
    max: 340 * DEGREE,
    default: 170 * DEGREE,
  }),
  statorSector: angle('turn', {
    label: 'Stator sector',
    min: 10 * DEGREE,
    max: 300 * DEGREE,
    default: 170 * DEGREE,
  }),
  statorEdgeOffset: length('turn', {
    label: 'Stator edges set in',
    min: -5,
    max: 30,
    default: 0,
  }),
  sense: choice<'anticlockwise' | 'clockwise'>('turn', {
    label: 'Meshes turning',
    options: [
      { value: 'anticlockwise', label: 'anticlockwise' },
      { value: 'clockwise', label: 'clockwise' },
    ],
    default: 'anticlockwise',
  }),
  shaftDiameter: length('shaft', {
    label: 'Shaft diameter',
    min: 1,
    max: 30,
    default: 6,
  }),
  spacerRadius: length('shaft', {
    label: 'Rotor spacer radius',
    min: 1,
    max: 60,
    default: 6,
  }),
  hubRadius: length('shaft', {
    label: 'Hub radius',
    min: 1,
    max: 60,
    default: 7,
  }),
  cutoutRadius: length('shaft', {
    label: 'Stator cut-out radius',
    min: 1.5,
    max: 80,
    default: 9,
  }),
  overhang: length('posts', {
    label: 'Stator overhang',
    min: 0,
    max: 40,
    default: 2,
  }),
  postCount: count('posts', {
    label: 'Stator posts',
    min: 2,
    max: 4,
    default: 3,
  }),
  postHoleDiameter: length('posts', {
    label: 'Post hole',
    min: 0.8,
    max: 20,
    default: 3.2,
  }),
  postSpacerRadius: length('posts', {
    label: 'Post spacer radius',
    min: 0.8,
    max: 30,
    default: 3.5,
  }),
  postWeb: length('posts', {
    label: 'Metal round the post hole',
    min: 0.2,
    max: 20,
    default: 2.5,
  }),
  postClearance: length('posts', {
    label: 'Rotor to post, at least',
    min: 0.1,
    max: 40,
    default: 2,
  }),
  postCircleRadius: optional('length', 'posts', {
    label: 'Post circle radius',
    min: 3,
    max: 300,
  }),
  largestRadius: length('envelope', {
    label: 'Largest radius allowed',
    min: 4,
    max: 300,
    default: 65,
  }),
  largestDepth: length('envelope', {
    label: 'Largest depth allowed',
    min: 1,
    max: 500,
    default: 60,
  }),
  sectionSpacing: length('envelope', {
    label: 'Between sections',
    min: 0.5,
    max: 100,
    default: 6,
  }),
  altitude: altitude('envelope', {
    label: 'Altitude of use',
    min: 0,
    max: 10e6,
    default: 0,
    cameLater: true,
  }),
  material: choice<'brass' | 'aluminium' | 'copper' | 'steel'>('sheet', {
    label: 'Sheet',
    options: [
      { value: 'brass', label: 'Brass CuZn37' },
      { value: 'aluminium', label: 'Aluminium EN AW-5754' },
      { value: 'copper', label: 'Copper Cu-ETP' },
      { value: 'steel', label: 'Steel DC01' },
    ],
    default: 'brass',
  }),
  finish: choice<'none' | 'silver'>('sheet', {
    label: 'Finish',
    options: [
      { value: 'none', label: 'bare' },
      { value: 'silver', label: 'silver plated' },
    ],
    default: 'none',
    cameLater: true,
  }),
  toleranceClass: choice<'f' | 'm' | 'c'>('sheet', {
    label: 'General tolerances',
    options: [
      { value: 'f', label: 'ISO 2768-f' },
      { value: 'm', label: 'ISO 2768-m' },
      { value: 'c', label: 'ISO 2768-c' },
    ],
    default: 'm',
    cameLater: true,
  }),
  projection: choice<'first' | 'third'>('sheet', {
    label: 'Drawing',
    options: [
      { value: 'first', label: 'first angle' },
      { value: 'third', label: 'third angle' },
    ],
    default: 'first',
    cameLater: true,
  }),
  spacerMaterial: choice<'as-plates' | 'brass' | 'aluminium' | 'steel'>('sheet', {
    label: 'Spacer metal',
    options: [
      { value: 'as-plates', label: 'as plates' },
      { value: 'brass', label: 'brass' },
      { value: 'aluminium', label: 'aluminium' },
      { value: 'steel', label: 'steel' },
    ],
    default: 'as-plates',
    cameLater: true,
  }),
  spacerMake: choice<'turned' | 'cut'>('frame', {
    label: 'Spacers',
    options: [
      { value: 'turned', label: 'turned' },
      { value: 'cut', label: 'cut rings' },
    ],
    default: 'turned',
    cameLater: true,
  }),
  endSlots: count('frame', {
    label: 'Slots in end rotor plates',
    min: 0,
    max: 12,
    default: 0,
    cameLater: true,
  }),
  endSlotWidth: length('frame', {
    label: 'Slot width',
    min: 0.2,
    max: 5,
    default: 0.8,
    cameLater: true,
  }),
  screens: choice<'none' | 'between'>('frame', {
    label: 'Screens',
    options: [
      { value: 'none', label: 'none' },
      { value: 'between', label: 'between sections' },
    ],
    default: 'none',
    cameLater: true,
  }),
  screenThickness: length('frame', {
    label: 'Screen thickness',
    min: 0.2,
    max: 6,
    default: 1,
    appliesTo: { screens: ['between'] },
    cameLater: true,
  }),
  frame: choice<'end-plates' | 'none'>('frame', {
    label: 'Frame',
    options: [
      { value: 'end-plates', label: 'end plates' },
      { value: 'none', label: 'none' },
    ],
    default: 'end-plates',
    cameLater: true,
  }),
  frameMaterial: choice<'aluminium' | 'brass' | 'steel' | 'insulator'>('frame', {
    label: 'Frame sheet',
    options: [
      { value: 'aluminium', label: 'aluminium' },
      { value: 'brass', label: 'brass' },
      { value: 'steel', label: 'steel' },
      { value: 'insulator', label: 'insulator' },
    ],
    default: 'aluminium',
    appliesTo: FRAMED,
    cameLater: true,
  }),
  frameThickness: length('frame', {
    label: 'Frame thickness',
    min: 0.5,
    max: 20,
    default: 2,
    appliesTo: FRAMED,
    cameLater: true,
  }),
  frameClearance: length('frame', {
    label: 'Plates to frame',
    min: 1,
    max: 100,
    default: 5,
    appliesTo: FRAMED,
    cameLater: true,
  }),
  bearingDiameter: optional('length', 'frame', {
    label: 'Bearing hole',
    min: 1,
    max: 60,
    appliesTo: FRAMED,
    cameLater: true,
  }),
  bushFlange: length('frame', {
    label: 'Insulating bush, flange',
    min: 0.5,
    max: 20,
    default: 2,
    appliesTo: FRAMED,
    cameLater: true,
  }),
  pillarDiameter: length('frame', {
    label: 'Frame pillar',
    min: 2,
    max: 40,
    default: 6,
    appliesTo: FRAMED,
    cameLater: true,
  }),
  shaftFront: length('frame', {
    label: 'Shaft beyond the front',
    min: 0,
    max: 200,
    default: 20,
    appliesTo: FRAMED,
    cameLater: true,
  }),
  bracket: choice<'none' | 'panel'>('frame', {
    label: 'Panel bracket',
    options: [
      { value: 'none', label: 'none' },
      { value: 'panel', label: 'panel plate' },
    ],
    default: 'none',
    appliesTo: FRAMED,
    cameLater: true,
  }),
} as const satisfies Record<string, Parameter>;

export type SectionKey = keyof typeof sectionParameters;
export type SharedKey = keyof typeof sharedParameters;

/** Does a parameter count beside these values of its table? */
export function applies(
  parameter: Parameter,
  values: Readonly<Record<string, unknown>>,
): boolean {
  return Object.entries(parameter.appliesTo ?? {}).every(([key, choices]) =>
    choices.some((choice) => choice === values[key]),
  );
}
