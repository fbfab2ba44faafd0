/** The kernel: from a tuning law to plates. Pure; the same in page, worker, route and test. */

export { KERNEL_VERSION } from './version';
export { checkDesign, checkParameter } from './check';
export { derive, type DeriveOptions } from './derive';
export { createEdgeCache, type EdgeCache } from './field/cell-field';
export {
  defaultDesign,
  defaultSection,
  MAX_SECTIONS,
  type Design,
  type Section,
  type SharedValues,
} from './design';
export type {
  Derivation,
  Derived,
  FieldModel,
  LawCheck,
  LawError,
  Plate,
  PlateRole,
  Post,
  SectionResult,
  Stack,
  StackPlate,
  StackSpacer,
  Turn,
} from './derived';
export { MOST_POINTS, type LawPoint } from './law-points';
export { KernelError, type KernelErrorCode } from './error';
export type { Finding, FindingCode, Severity } from './finding';
export {
  arcOf,
  walk,
  type Arc,
  type Circle,
  type Contour,
  type OutlineSink,
  type Path,
  type Point,
  type Vertex,
} from './outline';
export {
  applies,
  sectionParameters,
  sharedParameters,
  type ChoiceParameter,
  type NumberParameter,
  type OptionalNumberParameter,
  type Parameter,
  type ParameterGroup,
  type PointsParameter,
  type TextParameter,
  type Quantity,
  type SectionKey,
  type SharedKey,
  type TargetKind,
} from './parameters';
export { resonantCapacitance, resonantFrequency } from './resonance';
export { formatQuantity, writeQuantity, type WrittenQuantity } from './quantity';
